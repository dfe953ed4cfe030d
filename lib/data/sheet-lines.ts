import 'server-only'
import { Op } from 'sequelize'
import type { SheetLine } from '@/lib/schemas/views'
import { CutSheet } from '@/models'

/** The current revisions of a job's sheets, by number. The caller has read the job, wall and all. */
export async function currentSheets(jobId: string): Promise<SheetLine[]> {
  const rows = await CutSheet.findAll({
    where: { jobId, supersededAt: { [Op.is]: null } },
    attributes: ['sheet', 'name', 'calculator', 'revision', 'measuredBy', 'measuredOn', 'createdAt'],
    order: [['sheet', 'ASC']],
    raw: true,
  })
  return rows.map(({ createdAt, ...plain }) => ({ ...plain, createdAt: createdAt.toISOString() }))
}
