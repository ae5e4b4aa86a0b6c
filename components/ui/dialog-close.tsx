'use client'

import type { ReactNode } from 'react'
import { Button as AriaButton } from 'react-aria-components'

import { buttonClass, type ButtonTone } from './button-class'

type DialogCloseProps = { readonly children: ReactNode; readonly tone?: ButtonTone | undefined }

/** A button that closes the dialog around it without doing anything. */
export const DialogClose = ({ children, tone = 'plain' }: DialogCloseProps) => (
  <AriaButton slot="close" className={buttonClass(tone)}>
    {children}
  </AriaButton>
)
