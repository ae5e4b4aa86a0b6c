'use client'

import { useState } from 'react'

import { Button } from './button'

type CopyButtonProps = {
  readonly value: string
  /** What is copied, e.g. "SHA-256 of scan.csv"; part of the button's name. */
  readonly what: string
}

type Outcome = 'idle' | 'copied' | 'refused'

const words: Record<Outcome, string> = {
  idle: 'Copy',
  copied: 'Copied',
  refused: 'Not allowed here: select the text',
}

export const CopyButton = ({ value, what }: CopyButtonProps) => {
  const [outcome, setOutcome] = useState<Outcome>('idle')
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(value)
      setOutcome('copied')
    } catch {
      setOutcome('refused')
    }
  }
  return (
    <Button tone="quiet" size="small" className="min-h-6 px-1.5 py-0 font-normal" onClick={() => void copy()}>
      <span role="status">{words[outcome]}</span>
      <span className="sr-only">{` ${what}`}</span>
    </Button>
  )
}
