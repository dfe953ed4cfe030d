import type { Answer } from '@/lib/calculators/answer'
import { isCalculatorId } from '@/lib/calculators/load'
import type { Sheet } from '@/lib/print/sheet/sheet'
import type { Preferences } from '@/lib/schemas/account'
import { precisionOf } from '@/lib/schemas/precision'
import type { SheetView } from '@/lib/schemas/views'
import { revisingQuery } from '../job/sheet-place'
import { handbookPath, sheetOf } from './sheet-of'

/**
 * The printable sheet of a revision kept in a job, read as its reader reads. Its address is that of the current
 * revision, so that an old print leads to what stands now. Null when its calculator is no longer there.
 */
export async function keptSheet(view: SheetView, preferences: Preferences, origin: string): Promise<Sheet | null> {
  const { calculator, jobId, jobName, place, name, measuredBy, measuredOn, instrument } = view
  if (!isCalculatorId(calculator)) return null
  const { sheet, revision, currentRevision, note } = view
  const superseded = revision === currentRevision ? {} : { supersededBy: currentRevision }
  return sheetOf(calculator, {
    head: {
      ...{ job: jobName, place, sheet: name, measuredBy, measuredOn, instrument },
      kept: { sheet, revision, note, ...superseded },
    },
    answer: view.results as unknown as Answer,
    reading: { precision: precisionOf(preferences), preferences },
    address: `${origin}/jobs/${jobId}/sheets/${sheet}`,
  })
}

/** Where the measure of a kept revision is opened to be revised. */
export async function revisePath({ calculator, inputs, jobId: job, sheet, revision }: SheetView): Promise<string> {
  if (!isCalculatorId(calculator)) return '/handbook'
  const path = await handbookPath(calculator, inputs)
  return `${path}${path.includes('?') ? '&' : '?'}${revisingQuery({ job, sheet, revision })}`
}
