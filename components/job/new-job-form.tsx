'use client'

import { zodResolver } from '@hookform/resolvers/zod'
import { useQueryClient } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { useForm } from 'react-hook-form'
import { FormProblem } from '@/components/account/form-problem'
import { useSending } from '@/components/account/use-sending'
import { Button } from '@/components/ui/button'
import { createJob } from '@/lib/queries/jobs'
import { jobSchema, type JobForm } from '@/lib/schemas/job'
import { JobFields } from './job-fields'

const empty: JobForm = { name: '', place: '', client: '', notes: '' }

/** Opens a job and goes to it. */
export function NewJobForm() {
  const router = useRouter()
  const client = useQueryClient()
  const [key] = useState(() => crypto.randomUUID())
  const form = useForm({ resolver: zodResolver(jobSchema), defaultValues: empty })
  const { submit, sending, problem } = useSending(form, async (job) => {
    const { id } = await createJob(job, key)
    await client.invalidateQueries({ queryKey: ['jobs'] })
    router.push(`/jobs/${id}`)
  })
  return (
    <form onSubmit={submit} method="post" noValidate>
      <JobFields register={form.register} errors={form.formState.errors} />
      <FormProblem>{problem}</FormProblem>
      <Button type="submit" variant="primary" disabled={sending}>
        {sending ? 'Opening…' : 'Open the job'}
      </Button>
    </form>
  )
}
