import { asAny, type AnyCalculator } from './define'

/** Every calculator, in the order of the handbook: id to its file, so that a page fetches its own entry only. */
const entries = {
  miter: async () => asAny((await import('./cutting/miter')).miter),
} satisfies Record<string, () => Promise<AnyCalculator>>

export type CalculatorId = keyof typeof entries

export const calculatorIds = Object.keys(entries) as CalculatorId[]

export const isCalculatorId = (id: string): id is CalculatorId => Object.hasOwn(entries, id)

/** Fetches one entry. */
export const loadCalculator = (id: CalculatorId): Promise<AnyCalculator> => entries[id]()
