import type { Metadata } from 'next'
import Link from 'next/link'
import { notFound } from 'next/navigation'
import { ChangeTable } from '@/components/job/change-table'
import { changesOf, inputLeaves, outputLeaves } from '@/components/job/compare'
import { precisionOf } from '@/lib/schemas/precision'
import { requireActor } from '@/lib/auth/session'
import { isCalculatorId, loadCalculator } from '@/lib/calculators/load'
import { getCutSheet } from '@/lib/data/read-sheets'
import { orNotFound } from '@/lib/http/or-not-found'
import { comparedRevisions, sheetParams } from '@/lib/schemas/job'

export const metadata: Metadata = { title: 'Compare revisions' }

export default async function ComparePage({ params, searchParams }: PageProps<'/jobs/[id]/sheets/[sheet]/compare'>) {
  const place = sheetParams.safeParse(await params)
  const asked = comparedRevisions.safeParse(await searchParams)
  if (!place.success || !asked.success) notFound()
  const { id, sheet } = place.data
  const path = `/jobs/${id}/sheets/${sheet}`
  const actor = await requireActor(path)
  const [was, is] = await Promise.all([
    orNotFound(getCutSheet(actor, id, sheet, asked.data.was)),
    orNotFound(getCutSheet(actor, id, sheet, asked.data.is)),
  ])
  if (!isCalculatorId(is.calculator)) notFound()
  const { inputs, outputs } = await loadCalculator(is.calculator)
  const precision = precisionOf(actor.preferences)
  const measured = changesOf(inputLeaves(inputs, was.inputs), inputLeaves(inputs, is.inputs), precision)
  const cut = changesOf(
    outputLeaves(outputs, was.results.outputs),
    outputLeaves(outputs, is.results.outputs),
    precision,
  )
  return (
    <>
      <p className="crumb">
        <Link href={path} prefetch={false}>
          {is.jobName}, {is.name}
        </Link>
      </p>
      <h1>
        Revision {was.revision} beside {is.revision}
      </h1>
      <p className="lede">{is.note || 'Nothing was noted about the change.'}</p>
      <h2 className="mt-8 mb-3">Measured differently</h2>
      <ChangeTable changes={measured} precision={precision} caption="Field measure, old beside new" />
      <h2 className="mt-8 mb-3">Cut differently</h2>
      <ChangeTable changes={cut} precision={precision} caption="Parts and marks, old beside new" />
    </>
  )
}
