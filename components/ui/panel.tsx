import type { ComponentProps } from 'react'
import { classNames } from './class-names'

/** A sheet of card on the paper. */
export function Panel({ className, ...rest }: ComponentProps<'section'>) {
  return (
    <section className={classNames('rounded-plate border border-rule bg-card p-6 max-sm:p-4', className)} {...rest} />
  )
}
