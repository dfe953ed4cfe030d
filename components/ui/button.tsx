import Link from 'next/link'
import type { ComponentProps } from 'react'
import { classNames } from './class-names'

export type ButtonVariant = 'primary' | 'outline' | 'quiet' | 'on-plate'

const shape =
  'inline-flex min-h-12 cursor-pointer items-center justify-center gap-2 rounded-[3px] px-[18px] py-2 font-head text-[19px] leading-tight font-semibold tracking-[.02em] no-underline disabled:cursor-default disabled:opacity-55'

const variants: Record<ButtonVariant, string> = {
  primary: 'border-2 border-ink bg-ink text-paper',
  outline: 'border-2 border-ink bg-transparent text-ink',
  quiet: 'border-2 border-transparent bg-transparent px-3 text-ink underline decoration-2 underline-offset-4',
  'on-plate': 'border-2 border-straw bg-straw text-(--on-straw)',
}

const look = (variant: ButtonVariant, extra?: string) => classNames('button', shape, variants[variant], extra)

/** 48 px high; one primary a view. */
export function Button({
  variant = 'outline',
  className,
  type = 'button',
  ...rest
}: ComponentProps<'button'> & { variant?: ButtonVariant }) {
  return <button type={type} className={look(variant, className)} {...rest} />
}

/** A link that looks like a button. */
export function ButtonLink({
  variant = 'outline',
  className,
  ...rest
}: ComponentProps<typeof Link> & { variant?: ButtonVariant }) {
  return <Link className={look(variant, className)} {...rest} />
}
