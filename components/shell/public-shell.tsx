import type { ReactNode } from 'react'

import { SkipLink } from '../ui/skip-link'
import { PracticeMark } from './practice-mark'
import { TitleBlock } from './title-block'

type PublicShellProps = {
  readonly practiceName: string
  readonly homeHref?: string | undefined
  /** Narrow for a form such as sign-in; wide for the result of a check. */
  readonly width?: 'narrow' | 'wide' | undefined
  readonly children: ReactNode
}

/** Pages that anybody may open: one sheet on the ruled bench. */
export const PublicShell = ({
  practiceName,
  homeHref = '/',
  width = 'narrow',
  children,
}: PublicShellProps) => (
  <div className="bench-grid flex min-h-dvh flex-col bg-ground">
    <SkipLink />
    <header className="mx-auto w-full max-w-page px-4 py-3 sm:px-6">
      <PracticeMark practiceName={practiceName} href={homeHref} />
    </header>
    <main id="main" tabIndex={-1} className="flex flex-1 flex-col items-center px-4 pt-4 sm:pt-10">
      <div
        className={`w-full rounded border border-rule-strong border-t-4 border-t-copper bg-sheet px-5 py-6 sm:px-8 ${
          width === 'narrow' ? 'max-w-lg' : 'max-w-4xl'
        }`}
      >
        {children}
      </div>
    </main>
    <TitleBlock practiceName={practiceName} />
  </div>
)
