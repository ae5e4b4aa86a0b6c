import Link from 'next/link'
import type { ComponentProps } from 'react'

import { buttonClass, type ButtonSize, type ButtonTone } from './button-class'

type LinkButtonProps = ComponentProps<typeof Link> & {
  readonly tone?: ButtonTone | undefined
  readonly size?: ButtonSize | undefined
}

/** A link that leads to the next step and so looks like a button. */
export const LinkButton = ({ tone, size, className, ...rest }: LinkButtonProps) => (
  <Link className={buttonClass(tone, size, className)} {...rest} />
)
