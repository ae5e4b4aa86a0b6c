'use client'

import type { ReactNode } from 'react'
import { Button as AriaButton, Menu as AriaMenu, MenuItem, MenuTrigger, Popover } from 'react-aria-components'

import { buttonClass, type ButtonSize, type ButtonTone } from './button-class'

export type MenuEntry = {
  readonly id: string
  readonly label: ReactNode
  /** An entry leads to an address … */
  readonly href?: string | undefined
  /** … or does something. */
  readonly onAction?: (() => void) | undefined
  readonly disabled?: boolean | undefined
}

type MenuProps = {
  readonly label: string
  readonly trigger: ReactNode
  readonly triggerTone?: ButtonTone | undefined
  readonly triggerSize?: ButtonSize | undefined
  readonly entries: readonly MenuEntry[]
}

/** A short list of further actions on one thing. */
export const Menu = ({ label, trigger, triggerTone, triggerSize, entries }: MenuProps) => (
  <MenuTrigger>
    <AriaButton className={buttonClass(triggerTone, triggerSize)}>
      {trigger}
      <svg viewBox="0 0 10 6" aria-hidden="true" className="w-2.5">
        <path d="M1 1L5 5L9 1" fill="none" stroke="currentColor" strokeWidth="1.75" />
      </svg>
    </AriaButton>
    <Popover
      placement="bottom end"
      className="min-w-44 rounded border border-rule-strong bg-sheet py-1 shadow-lift"
    >
      <AriaMenu aria-label={label} className="outline-none">
        {entries.map((entry) => (
          <MenuItem
            key={entry.id}
            id={entry.id}
            isDisabled={entry.disabled ?? false}
            {...(entry.href === undefined ? {} : { href: entry.href })}
            {...(entry.onAction === undefined ? {} : { onAction: entry.onAction })}
            className="block min-h-8 cursor-pointer px-4 py-1.5 text-ink no-underline -outline-offset-2 data-[disabled]:text-ink-faint data-[focused]:bg-sunk"
          >
            {entry.label}
          </MenuItem>
        ))}
      </AriaMenu>
    </Popover>
  </MenuTrigger>
)
