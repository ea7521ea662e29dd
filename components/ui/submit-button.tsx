'use client'

import { useFormStatus } from 'react-dom'
import { Button, type ButtonProps } from './button'

/** The button that sends the form around it, pending while the form's action runs. */
export function SubmitButton({ variant = 'primary', pending, ...rest }: ButtonProps) {
  const status = useFormStatus()
  return <Button type="submit" variant={variant} pending={pending || status.pending} {...rest} />
}
