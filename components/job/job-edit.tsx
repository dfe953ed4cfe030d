'use client'

import { zodResolver } from '@hookform/resolvers/zod'
import { useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { useForm } from 'react-hook-form'
import { FormProblem } from '@/components/account/form-problem'
import { useSending } from '@/components/account/use-sending'
import { Button } from '@/components/ui/button'
import { Panel } from '@/components/ui/panel'
import { changeJob, jobQuery } from '@/lib/queries/jobs'
import { ProblemError } from '@/lib/queries/send'
import { jobSchema, type JobForm } from '@/lib/schemas/job'
import type { JobView } from '@/lib/schemas/views'
import { JobFields } from './job-fields'
import { JobInBetween } from './job-in-between'

interface Props {
  job: JobView
  onDone: () => void
}

/** Changes a job. When somebody saved in between, what was typed stays and theirs is shown beside it. */
export function JobEdit({ job, onDone }: Props) {
  const client = useQueryClient()
  const [version, setVersion] = useState(job.version)
  const [theirs, setTheirs] = useState<JobView>()
  const { name, place, client: whom, notes } = job
  const form = useForm<JobForm, unknown, Required<JobForm>>({
    resolver: zodResolver(jobSchema),
    defaultValues: { name, place, client: whom, notes },
  })
  const showTheirs = async () => {
    const current = await client.fetchQuery({ ...jobQuery(job.id), staleTime: 0 })
    setTheirs(current)
    setVersion(current.version)
  }
  const { submit, sending, problem } = useSending(form, async (typed) => {
    try {
      await changeJob(job.id, { ...typed, version })
    } catch (error) {
      if (error instanceof ProblemError && error.problem.status === 409) return showTheirs()
      throw error
    }
    await client.invalidateQueries({ queryKey: ['jobs'] })
    onDone()
  })
  return (
    <Panel className="mb-8 max-w-[40rem]">
      <form onSubmit={submit} method="post" noValidate>
        {theirs && <JobInBetween theirs={theirs} />}
        <JobFields register={form.register} errors={form.formState.errors} />
        <FormProblem>{problem}</FormProblem>
        <div className="flex flex-wrap gap-3">
          <Button type="submit" variant="primary" disabled={sending}>
            {sending ? 'Saving…' : theirs ? 'Save mine over theirs' : 'Save the job'}
          </Button>
          <Button onClick={onDone}>Leave it as it was</Button>
        </div>
      </form>
    </Panel>
  )
}
