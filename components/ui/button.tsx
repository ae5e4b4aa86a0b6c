import type { ComponentPropsWithRef } from 'react'

import { buttonClass, type ButtonSize, type ButtonTone } from './button-class'

type ButtonProps = ComponentPropsWithRef<'button'> & {
  readonly tone?: ButtonTone | undefined
  readonly size?: ButtonSize | undefined
}

export const Button = ({ tone, size, className, type = 'button', ...rest }: ButtonProps) => (
  <button type={type} className={buttonClass(tone, size, className)} {...rest} />
)
