import { computeCalculator } from '@/lib/calculators/compute'
import type { ProofRow } from './rows'

/** A printed value beside ours. */
export interface Compared {
  row: ProofRow
  computed: number | string | boolean
  /** Ours less the print, in the unit of the row; null where there is nothing to subtract. */
  difference: number | null
  agrees: boolean
}

/** Binary fractions miss a printed decimal by less than this. */
const hair = 1e-9

/** Follows a path such as `parts.A.topEdge`: a list is entered by place, or by the id or mark of an item. */
function at(outputs: unknown, path: string): unknown {
  return path.split('.').reduce((inside: unknown, key) => {
    if (Array.isArray(inside)) return inside.find((item: unknown) => isNamed(item, key)) ?? inside[Number(key)]
    return isRecord(inside) ? inside[key] : undefined
  }, outputs)
}

const isRecord = (item: unknown): item is Record<string, unknown> => typeof item === 'object' && item !== null
const isNamed = (item: unknown, key: string) => isRecord(item) && (item.id === key || item.mark === key)

function agreement(computed: unknown, { printed, tolerance }: ProofRow): Pick<Compared, 'difference' | 'agrees'> {
  if (typeof computed !== 'number' || typeof printed !== 'number')
    return { difference: null, agrees: computed === printed }
  const difference = computed - printed
  return { difference, agrees: Math.abs(difference) <= (tolerance ?? 0) + hair }
}

/**
 * Computes one printed row and sets the answer beside the print.
 * @throws Error when the calculator refuses the inputs or has no such output: then the row itself is wrong.
 */
export async function compareRow(calculator: string, row: ProofRow): Promise<Compared> {
  const answered = await computeCalculator(calculator, row.inputs)
  if (!answered.ok) throw new Error(`${calculator}, ${row.source}: ${JSON.stringify(answered.errors)}`)
  const computed = at(answered.answer.outputs, row.output)
  if (typeof computed !== 'number' && typeof computed !== 'string' && typeof computed !== 'boolean')
    throw new Error(`${calculator} gives no ${row.output}`)
  return { row, computed, ...agreement(computed, row) }
}
