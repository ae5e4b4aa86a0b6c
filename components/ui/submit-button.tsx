'use client'

import type { ReactNode } from 'react'
import { useFormStatus } from 'react-dom'

import { Button } from './button'
import type { ButtonSize, ButtonTone } from './button-class'

type SubmitButtonProps = {
  readonly children: ReactNode
  /** What the button says while the form is being sent, e.g. "Saving…". */
  readonly pendingLabel: string
  readonly tone?: ButtonTone | undefined
  readonly size?: ButtonSize | undefined
  readonly name?: string | undefined
  readonly value?: string | undefined
  readonly disabled?: boolean | undefined
}

/** Sends the form around it; while that runs it says so and ignores a second press. */
export const SubmitButton = ({
  children,
  pendingLabel,
  tone = 'primary',
  size,
  disabled = false,
  ...rest
}: SubmitButtonProps) => {
  const { pending } = useFormStatus()
  return (
    <Button
      type="submit"
      tone={tone}
      size={size}
      disabled={disabled}
      aria-disabled={pending || undefined}
      onClick={(event) => {
        if (pending) event.preventDefault()
      }}
      {...rest}
    >
      {pending ? pendingLabel : children}
    </Button>
  )
}
