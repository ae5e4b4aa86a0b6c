import { classNames } from './class-names'

export type ButtonTone = 'primary' | 'plain' | 'quiet'
export type ButtonSize = 'normal' | 'small'

const base =
  'inline-flex items-center justify-center gap-2 rounded border font-semibold text-center transition-colors no-underline ' +
  'disabled:opacity-60 aria-disabled:opacity-60'

const tones: Record<ButtonTone, string> = {
  primary: 'border-copper bg-copper text-on-copper hover:border-copper-strong hover:bg-copper-strong',
  plain: 'border-rule-strong bg-sheet text-ink hover:border-ink hover:bg-sunk',
  quiet: 'border-transparent bg-transparent text-ink hover:border-rule-strong hover:bg-sunk',
}

const sizes: Record<ButtonSize, string> = {
  normal: 'min-h-10 px-4 py-1.5 text-base',
  small: 'min-h-8 px-2.5 py-1 text-sm',
}

/** The look of anything pressed: one primary action a view, plain for the rest, quiet inside tables and bars. */
export const buttonClass = (
  tone: ButtonTone = 'plain',
  size: ButtonSize = 'normal',
  extra?: string,
): string => classNames(base, tones[tone], sizes[size], extra)
