'use client'

import { useRouter } from 'next/navigation'
import { signIn } from 'next-auth/react'
import { useState, type FormEvent } from 'react'

import { SubmitRow } from '../forms/submit-row'
import { FormErrorSummary } from '../ui/form-error-summary'
import { TextField } from '../ui/text-field'

const sentences: Readonly<Record<string, string>> = {
  wrong_credentials:
    'E-mail address and password do not belong together. Check both, or ask for a new password below.',
  throttled: 'Too many attempts in a short time. Wait 15 minutes, then try again.',
}

const other = 'The sign-in did not go through. Check the connection and try again.'

/** E-mail and password. A refused attempt keeps what was typed. */
export const SignInForm = () => {
  const router = useRouter()
  const [problem, setProblem] = useState<string | null>(null)
  const [isPending, setPending] = useState(false)

  const send = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const form = new FormData(event.currentTarget)
    setPending(true)
    setProblem(null)
    const reason = await attempt(String(form.get('email')), String(form.get('password')))
    if (reason === null) {
      router.push('/')
      router.refresh()
      return
    }
    setProblem(sentences[reason] ?? other)
    setPending(false)
  }

  return (
    <form method="post" onSubmit={(event) => void send(event)} noValidate className="flex flex-col gap-4">
      {problem ? <FormErrorSummary title="Not signed in." errors={[{ message: problem }]} /> : null}
      <TextField name="email" label="E-mail address" type="email" autoComplete="username" />
      <TextField name="password" label="Password" type="password" autoComplete="current-password" />
      <SubmitRow label="Sign in" pendingLabel="Signing in…" isPending={isPending} />
    </form>
  )
}

/** @returns null after success, else a code that says why not. */
async function attempt(email: string, password: string): Promise<string | null> {
  try {
    const answer = await signIn('credentials', { redirect: false, email, password })
    // next-auth answers a lost race for its own token with a success that holds this mark.
    if (!answer || answer.url?.includes('csrf=true')) return 'lost'
    return answer.error ?? (answer.ok ? null : 'lost')
  } catch {
    return 'lost'
  }
}
