'use client'

import { useInfiniteQuery, useQueryClient } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { useId, useState } from 'react'
import { useForm, useWatch } from 'react-hook-form'
import { FormProblem } from '@/components/account/form-problem'
import { useSending } from '@/components/account/use-sending'
import { Button } from '@/components/ui/button'
import { useMe } from '@/components/ui/me'
import { LoadingState } from '@/components/ui/states'
import { TextField } from '@/components/ui/text-field'
import { usePreferences } from '@/components/ui/use-preferences'
import { createJob, jobsQuery } from '@/lib/queries/jobs'
import { saveSheet } from '@/lib/queries/sheets'
import { precisionOf } from '@/lib/schemas/precision'
import type { Saving } from './saving'
import { SheetHeadFields, type SheetHead } from './sheet-head-fields'
import { today } from './today'

interface Typed extends SheetHead {
  /** Empty for a new job. */
  job: string
  newJob: string
}

interface SaveFormProps extends Saving {
  /** Job to offer first. */
  jobId?: string
  onClose: () => void
}

/** Which job, and what stands at the head of the sheet; then the sheet is saved and shown. */
export function SaveForm({ calculator, inputs, jobId, onClose }: SaveFormProps) {
  const router = useRouter()
  const client = useQueryClient()
  const id = useId()
  const me = useMe()
  const preferences = usePreferences()
  const [keys] = useState(() => ({ job: crypto.randomUUID(), sheet: crypto.randomUUID() }))
  const jobs = useInfiniteQuery(jobsQuery())
  const lines = jobs.data?.pages.flatMap((page) => page.lines) ?? []
  const form = useForm<Typed>({
    defaultValues: {
      job: jobId ?? '',
      newJob: '',
      name: '',
      measuredBy: me?.name ?? '',
      measuredOn: today(),
      instrument: 'tape',
      note: '',
    },
  })
  const { register, control, formState } = form
  const job = useWatch({ control, name: 'job' })
  const { submit, sending, problem } = useSending<Typed, Typed>(form, async ({ job: chosen, newJob, ...head }) => {
    const kept = chosen || (await createJob({ name: newJob }, keys.job)).id
    const { sheet } = await saveSheet(
      kept,
      { ...head, calculator, inputs, precision: precisionOf(preferences) },
      keys.sheet,
    )
    await client.invalidateQueries({ queryKey: ['jobs'] })
    onClose()
    router.push(`/jobs/${kept}/sheets/${sheet}`)
  })
  if (jobs.isPending) return <LoadingState title="Opening the job book…" />
  return (
    <form onSubmit={submit} method="post" noValidate>
      <div className="field">
        <label htmlFor={id} className="field-label">
          Job
        </label>
        <select id={id} className="field-box field-input" {...register('job')}>
          <option value="">A new job</option>
          {lines.map(({ id: value, name, place }) => (
            <option key={value} value={value}>
              {place ? `${name}, ${place}` : name}
            </option>
          ))}
        </select>
      </div>
      {job === '' && (
        <TextField
          label="New job"
          hint="As the shop calls it."
          fault={formState.errors.newJob?.message}
          {...register('newJob', { required: 'Name the job.' })}
        />
      )}
      <SheetHeadFields register={register as never} errors={formState.errors} revising={false} />
      <FormProblem>{problem}</FormProblem>
      <div className="flex flex-wrap gap-3">
        <Button type="submit" variant="primary" disabled={sending}>
          {sending ? 'Saving…' : 'Save the cut sheet'}
        </Button>
        <Button onClick={onClose}>Back</Button>
      </div>
    </form>
  )
}
