'use client'

import type { ReactNode } from 'react'
import {
  Button as AriaButton,
  Dialog as AriaDialog,
  DialogTrigger,
  Heading,
  Modal,
  ModalOverlay,
} from 'react-aria-components'

import { buttonClass, type ButtonSize, type ButtonTone } from './button-class'

type DialogProps = {
  readonly title: ReactNode
  /** What the button that opens it says; leave out when `isOpen` is controlled. */
  readonly trigger?: ReactNode
  readonly triggerTone?: ButtonTone | undefined
  readonly triggerSize?: ButtonSize | undefined
  readonly children: ReactNode
  readonly isOpen?: boolean | undefined
  readonly onOpenChange?: ((isOpen: boolean) => void) | undefined
}

const Panel = ({ title, children, ...state }: Omit<DialogProps, 'trigger'>) => (
  <ModalOverlay
    isDismissable
    {...(state.isOpen === undefined ? {} : { isOpen: state.isOpen })}
    {...(state.onOpenChange === undefined ? {} : { onOpenChange: state.onOpenChange })}
    className="fixed inset-0 z-40 flex items-start justify-center overflow-y-auto bg-scrim p-4 sm:pt-[12vh]"
  >
    <Modal className="w-full max-w-xl rounded border border-rule-strong border-t-4 border-t-copper bg-sheet shadow-lift">
      <AriaDialog className="outline-none">
        <div className="flex items-start justify-between gap-4 px-5 pt-4">
          <Heading slot="title" className="text-xl">
            {title}
          </Heading>
          <AriaButton
            slot="close"
            aria-label="Close"
            className={buttonClass('quiet', 'small', '-mr-2 min-w-8')}
          >
            <svg viewBox="0 0 12 12" aria-hidden="true" className="size-3">
              <path d="M1 1L11 11M11 1L1 11" stroke="currentColor" strokeWidth="1.75" />
            </svg>
          </AriaButton>
        </div>
        <div className="px-5 pb-5 pt-2">{children}</div>
      </AriaDialog>
    </Modal>
  </ModalOverlay>
)

/** A question that must be answered before going on. Escape, the cross or a press outside closes it. */
export const Dialog = ({ trigger, triggerTone, triggerSize, ...panel }: DialogProps) => {
  if (trigger === undefined) return <Panel {...panel} />
  return (
    <DialogTrigger>
      <AriaButton className={buttonClass(triggerTone, triggerSize)}>{trigger}</AriaButton>
      <Panel {...panel} />
    </DialogTrigger>
  )
}
