'use client'

import { useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { FormProblem } from '@/components/account/form-problem'
import { Button } from '@/components/ui/button'
import { archiveJob, changeJob } from '@/lib/queries/jobs'
import { sentenceOf } from '@/lib/queries/sentence'
import type { JobView } from '@/lib/schemas/views'

/** Puts a job away, or takes it out again. */
export function ArchiveButton({ job: { id, version, archivedAt } }: { job: JobView }) {
  const client = useQueryClient()
  const [problem, setProblem] = useState<string>()
  const move = async () => {
    setProblem(undefined)
    try {
      await (archivedAt ? changeJob(id, { archived: false, version }) : archiveJob(id, version))
    } catch (error) {
      setProblem(sentenceOf(error))
    }
    await client.invalidateQueries({ queryKey: ['jobs'] })
  }
  return (
    <>
      <Button variant="quiet" onClick={move}>
        {archivedAt ? 'Take it out again' : 'Put the job away'}
      </Button>
      <FormProblem>{problem}</FormProblem>
    </>
  )
}
