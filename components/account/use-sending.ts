'use client'

import type { FieldValues, Path, UseFormReturn } from 'react-hook-form'
import { useHydrated } from '@/components/ui/use-hydrated'
import { ProblemError } from '@/lib/queries/send'
import { sentenceOf } from '@/lib/queries/sentence'

/**
 * Sends a form and puts what is refused where it belongs: a sentence at each named field, the rest above the button.
 * What was typed stays.
 */
export function useSending<Typed extends FieldValues, Read>(
  form: UseFormReturn<Typed, unknown, Read>,
  work: (values: Read) => Promise<void>,
) {
  const refuse = (error: unknown) => {
    const faults = error instanceof ProblemError ? (error.problem.errors ?? []) : []
    const known = faults.filter(({ field }) => field in form.getValues())
    for (const [i, { field, message }] of known.entries())
      form.setError(field as Path<Typed>, { message }, { shouldFocus: i === 0 })
    if (known.length === 0) form.setError('root', { message: sentenceOf(error) })
  }
  const ready = useHydrated()
  return {
    /** False until the page's scripts are there: sent without them, a form would only be emptied. */
    ready,
    submit: form.handleSubmit((values) => work(values).catch(refuse)),
    sending: form.formState.isSubmitting,
    problem: form.formState.errors.root?.message,
  }
}
