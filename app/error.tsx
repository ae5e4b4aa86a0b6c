'use client'

import { Button } from '@/components/ui/button'

type ErrorPageProps = { readonly error: Error & { digest?: string }; readonly reset: () => void }

export default function ErrorPage({ error, reset }: ErrorPageProps) {
  return (
    <main className="mx-auto max-w-lg px-4 py-16">
      <title>Something went wrong · Quellbench</title>
      <h1 className="text-2xl">Something went wrong on our side</h1>
      <p className="my-4">
        Nothing was changed. Try again; if it stays, tell the practice
        {error.digest ? (
          <>
            {' '}
            and quote <span className="num">{error.digest}</span>
          </>
        ) : null}
        .
      </p>
      <Button tone="primary" onClick={reset}>
        Try again
      </Button>
    </main>
  )
}
