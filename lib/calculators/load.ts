import { asAny, type AnyCalculator } from './define'

/** Every calculator, in the order of the handbook: id to its file, so that a page fetches its own entry only. */
const entries = {
  'tape-math': async () => asAny((await import('./triangle/tape-math')).tapeMath),
  pitch: async () => asAny((await import('./triangle/pitch')).pitch),
  'field-check': async () => asAny((await import('./triangle/field-check')).fieldCheckEntry),
  'nosing-line': async () => asAny((await import('./field/nosing-line')).nosingLineEntry),
  'knuckle-height': async () => asAny((await import('./field/knuckle-height')).knuckleHeight),
  handrail: async () => asAny((await import('./field/handrail')).handrail),
  miter: async () => asAny((await import('./cutting/miter')).miter),
  'long-short-point': async () => asAny((await import('./cutting/long-short-point')).longShortPoint),
  'saw-dial': async () => asAny((await import('./cutting/saw-dial')).sawDialEntry),
  'cut-list': async () => asAny((await import('./cutting/cut-list')).cutListEntry),
} satisfies Record<string, () => Promise<AnyCalculator>>

export type CalculatorId = keyof typeof entries

export const calculatorIds = Object.keys(entries) as CalculatorId[]

export const isCalculatorId = (id: string): id is CalculatorId => Object.hasOwn(entries, id)

/** Fetches one entry. */
export const loadCalculator = (id: CalculatorId): Promise<AnyCalculator> => entries[id]()
