import 'server-only'
import { literal, Op } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { NotFound } from '@/lib/errors'
import type { RevisionLine, SheetView } from '@/lib/schemas/views'
import { CutSheet } from '@/models'
import { idOf, mayWrite, visibleTo } from './job-book'

const revisionAttributes = ['revision', 'note', 'measuredBy', 'measuredOn', 'createdAt', 'supersededAt'] as const
const sheetAttributes = [
  'sheet',
  'name',
  'calculator',
  'calculatorRevision',
  'instrument',
  'inputs',
  'results',
] as const
const author = { association: 'author', attributes: ['name'], required: true }

/** What the joined rows carry beside the sheet's own columns. */
interface Joined {
  author: { name: string }
  job: { name: string; place: string; client: string }
  currentRevision: number
}

/** The job around a sheet, with the wall in it: a foreign job has no sheets. */
const jobOf = (actor: Actor) => ({
  association: 'job',
  attributes: ['name', 'place', 'client'],
  where: visibleTo(actor),
  required: true,
})

/** One revision of a sheet, the current one unless named. @throws NotFound */
export async function getCutSheet(actor: Actor, jobId: string, sheet: number, revision?: number): Promise<SheetView> {
  const which = revision === undefined ? { supersededAt: { [Op.is]: null } } : { revision }
  const row = await CutSheet.findOne({
    where: { jobId: idOf(jobId), sheet, ...which },
    attributes: [...revisionAttributes, ...sheetAttributes, 'jobId', currentRevision],
    include: [jobOf(actor), author],
    raw: true,
    nest: true,
  })
  if (!row) throw new NotFound()
  const { author: by, job, currentRevision: current, ...plain } = row as CutSheet & Joined
  return {
    ...plain,
    ...datesOf(plain),
    createdBy: by.name,
    jobName: job.name,
    place: job.place,
    client: job.client,
    currentRevision: current,
    writable: mayWrite(actor),
  }
}

const currentRevision: [ReturnType<typeof literal>, string] = [
  literal('(SELECT MAX(c.revision) FROM cut_sheets c WHERE c.jobId = CutSheet.jobId AND c.sheet = CutSheet.sheet)'),
  'currentRevision',
]

/** All revisions of a sheet, newest first. @throws NotFound */
export async function listRevisions(actor: Actor, jobId: string, sheet: number): Promise<RevisionLine[]> {
  const rows = await CutSheet.findAll({
    where: { jobId: idOf(jobId), sheet },
    attributes: [...revisionAttributes],
    include: [{ ...jobOf(actor), attributes: [] }, author],
    order: [['revision', 'DESC']],
    raw: true,
    nest: true,
  })
  if (rows.length === 0) throw new NotFound()
  return rows.map((row) => {
    const { author: by, revision, note, measuredBy, measuredOn, ...dates } = row as CutSheet & Joined
    return { revision, note, measuredBy, measuredOn, ...datesOf(dates), createdBy: by.name }
  })
}

function datesOf({ createdAt, supersededAt }: { createdAt: Date; supersededAt: Date | null }) {
  return { createdAt: createdAt.toISOString(), supersededAt: supersededAt?.toISOString() ?? null }
}
