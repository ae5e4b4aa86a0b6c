import Link from 'next/link'
import type { ComponentProps } from 'react'

import { classNames } from './class-names'

/** A link inside text or a table cell. */
export const TextLink = ({ className, ...rest }: ComponentProps<typeof Link>) => (
  <Link className={classNames('text-link', className)} {...rest} />
)
