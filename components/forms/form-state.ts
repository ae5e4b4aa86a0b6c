'use client'

import { createContext, useContext } from 'react'

import type { ActionState } from '@/lib/core/action-state'

export const FormState = createContext<ActionState>({ status: 'idle' })

/** The sentence that the last submission got for this field, if it was refused. */
export function useFieldError(name: string): string | undefined {
  const state = useContext(FormState)
  return state.status === 'failed' ? state.error.fields?.[name] : undefined
}
