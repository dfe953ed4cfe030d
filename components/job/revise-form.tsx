'use client'

import { useQuery, useQueryClient } from '@tanstack/react-query'
import Link from 'next/link'
import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { useForm } from 'react-hook-form'
import { FormProblem } from '@/components/account/form-problem'
import { useSending } from '@/components/account/use-sending'
import { Button } from '@/components/ui/button'
import { LoadingState } from '@/components/ui/states'
import { usePreferences } from '@/components/ui/use-preferences'
import { ProblemError } from '@/lib/queries/send'
import { sentenceOf } from '@/lib/queries/sentence'
import { openedQuery, reviseSheet } from '@/lib/queries/sheets'
import { precisionOf } from '@/lib/schemas/precision'
import type { SheetView } from '@/lib/schemas/views'
import type { Saving } from './saving'
import type { OpenedSheet } from './sheet-place'
import { SheetHeadFields, type SheetHead } from './sheet-head-fields'

interface ReviseFormProps extends Saving {
  opened: OpenedSheet
  onClose: () => void
}

/** The next revision of a kept sheet: what changed, and what stands at its head. */
export function ReviseForm(props: ReviseFormProps) {
  const { opened, calculator, onClose } = props
  const kept = useQuery(openedQuery(opened))
  if (kept.isPending) return <LoadingState title="Opening the saved sheet…" />
  const fits = kept.data?.calculator === calculator
  if (kept.data && fits) return <Revision {...props} kept={kept.data} />
  return (
    <>
      <FormProblem>
        {kept.error
          ? sentenceOf(kept.error)
          : 'The saved sheet is of another calculator. Save this one as a sheet of its own.'}
      </FormProblem>
      <div className="flex flex-wrap gap-3">
        {kept.error && <Button onClick={() => void kept.refetch()}>Try again</Button>}
        <Button onClick={onClose}>Close</Button>
      </div>
    </>
  )
}

function Revision({ opened, calculator, inputs, kept, onClose }: ReviseFormProps & { kept: SheetView }) {
  const { job, sheet } = opened
  const router = useRouter()
  const client = useQueryClient()
  const preferences = usePreferences()
  /** The revision that this one replaces: the one that was read, until its reader takes another's save over. */
  const [revises, setRevises] = useState(opened.revision)
  const [standing, setStanding] = useState<number | null>(null)
  const [key, setKey] = useState(() => crypto.randomUUID())
  const { name, measuredBy, measuredOn, instrument } = kept
  const form = useForm<SheetHead>({ defaultValues: { name, measuredBy, measuredOn, instrument, note: '' } })
  const path = `/jobs/${job}/sheets/${sheet}`
  const { submit, sending, problem } = useSending<SheetHead, SheetHead>(form, async (head) => {
    const numbers = { calculator, inputs, precision: precisionOf(preferences) }
    try {
      await reviseSheet(job, sheet, { ...head, ...numbers, revises }, key)
    } catch (error) {
      if (error instanceof ProblemError && error.problem.status === 409) setStanding(error.problem.current ?? null)
      throw error
    }
    await client.invalidateQueries({ queryKey: ['jobs'] })
    onClose()
    router.push(path)
    router.refresh()
  })
  const takeOver = (current: number) => {
    setRevises(current)
    setStanding(null)
    setKey(crypto.randomUUID())
    form.clearErrors('root')
  }
  return (
    <form onSubmit={submit} method="post" noValidate>
      <p className="mb-4">
        Becomes revision {revises + 1} of {kept.name}, {kept.jobName}. Revision {revises} is then superseded.
      </p>
      <SheetHeadFields register={form.register} errors={form.formState.errors} revising />
      {standing === null ? (
        <FormProblem>{problem}</FormProblem>
      ) : (
        <Overtaken path={path} read={revises} standing={standing} onTakeOver={() => takeOver(standing)} />
      )}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" variant="primary" disabled={sending || standing !== null}>
          {sending ? 'Saving…' : `Save revision ${revises + 1}`}
        </Button>
        <Button onClick={onClose}>Back</Button>
      </div>
    </form>
  )
}

interface OvertakenProps {
  path: string
  read: number
  standing: number
  onTakeOver: () => void
}

/** Somebody else saved meanwhile: nothing typed is lost, and nothing of theirs is written over unseen. */
function Overtaken({ path, read, standing, onTakeOver }: OvertakenProps) {
  return (
    <div role="alert" className="mb-5 border-l-8 border-l-off bg-paper p-4">
      <p className="mb-2">
        Somebody saved revision {standing} while you worked on revision {read}. Yours is not saved yet, and all of it is
        still here.
      </p>
      <p className="mb-3">
        <Link href={`${path}/compare?was=${read}&is=${standing}`} prefetch={false} target="_blank">
          See what they changed
        </Link>
      </p>
      <Button onClick={onTakeOver}>Save mine after theirs</Button>
    </div>
  )
}
