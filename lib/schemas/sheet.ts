import { preferencesSchema } from './account'
import { askSchema } from './calculator'
import { optionalText } from './text'
import { z } from './zod'

/** Papers that a sheet is drawn for. */
export const papers = ['letter', 'a4'] as const
export type Paper = (typeof papers)[number]
const paper = z.enum(papers, { error: 'The paper is letter or a4.' })

/** What may stand at the head of a sheet that is kept in no job. */
const headSchema = z.strictObject({
  job: optionalText('The job', 120).default(''),
  place: optionalText('The place', 200).default(''),
  sheet: optionalText('The sheet’s name', 80).default(''),
  measuredBy: optionalText('Measured by', 80).default(''),
  measuredOn: z.union([z.literal(''), z.iso.date()], { error: 'Write the day as 2026-03-31.' }).default(''),
  instrument: optionalText('The instrument', 120).default(''),
})

/** Body of a printable sheet: what the calculator takes, how the reader reads, and what stands at the head. */
export const sheetAskSchema = askSchema.extend({
  paper: paper.default('letter'),
  units: preferencesSchema.shape.units.default('in'),
  sawSquare: preferencesSchema.shape.sawSquare.default(0),
  head: headSchema.prefault({}),
})
export type SheetAsk = z.input<typeof sheetAskSchema>

/** Which revision of a kept sheet, on which paper. */
export const keptSheetQuery = z.object({
  revision: z.coerce.number().int().min(1).max(9999).optional(),
  paper: paper.default('letter'),
})
