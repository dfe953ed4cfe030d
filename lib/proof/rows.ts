import { z } from 'zod'
import { computeCalculator } from '@/lib/calculators/compute'
import { valueAt } from './path'

const said = z.string().min(3)

/** One published value: what to give the calculator, and what the print says comes out. */
const proofRowSchema = z.strictObject({
  id: said,
  quantity: said,
  inputs: z.record(z.string(), z.unknown()),
  /** The output that is compared; inside lists and groups a path such as `parts/A/topEdge`. */
  output: z.string().min(1),
  /** In the unit of the output. */
  printed: z.union([z.number(), z.string().min(1), z.boolean()]),
  /** As the print writes it, where that is not the number itself: 32° 8′. */
  asPrinted: z.string().min(1).optional(),
  /** What the print's own rounding allows; anything wider is explained in the note. */
  tolerance: z.number().nonnegative(),
  /** A value looked up in the very table that the calculator copies proves the copying only. */
  kind: z.enum(['computed', 'looked-up']),
  source: said,
  where: said,
  provenance: said,
  note: said.optional(),
  /** Why the print is taken to be wrong: then it must disagree. */
  printIsWrong: said.optional(),
})

/** A file of `content/proof`: published values only, never one of our own working. */
export const proofFileSchema = z.strictObject({ calculator: said, rows: z.array(proofRowSchema).min(1) })

export type ProofRow = z.infer<typeof proofRowSchema>

/** A published value beside ours. */
export interface Compared {
  row: ProofRow
  computed: number | string | boolean
  /** Ours less the print, in the output's unit; null where there is nothing to subtract. */
  difference: number | null
  agrees: boolean
}

/**
 * Computes one published row and sets the answer beside the print.
 * @throws Error when the calculator refuses the inputs or has no such output: then the row itself is wrong.
 */
export async function compareRow(calculator: string, row: ProofRow): Promise<Compared> {
  const answered = await computeCalculator(calculator, row.inputs)
  if (!answered.ok) throw new Error(`${calculator} ${row.id}: ${JSON.stringify(answered.errors)}`)
  const computed = valueAt(answered.answer.outputs, row.output)
  if (typeof computed !== 'number' && typeof computed !== 'string' && typeof computed !== 'boolean')
    throw new Error(`${calculator} ${row.id}: there is no ${row.output}`)
  if (typeof computed !== 'number' || typeof row.printed !== 'number')
    return { row, computed, difference: null, agrees: computed === row.printed }
  const difference = computed - row.printed
  return { row, computed, difference, agrees: Math.abs(difference) <= row.tolerance }
}
