/** A field measure as it is typed: text by the very paths that the entry's inputs and faults go by. */

export type Tree = string | readonly Tree[] | { readonly [name: string]: Tree }
export type Texts = Readonly<Record<string, string>>
/** How a flight was measured. */
export type Way = 'tape' | 'rake' | 'count'
export type FlightTexts = Texts & { readonly way: Way }
export type EndTexts = Readonly<Record<string, string | Texts>> & { readonly type: string; readonly return: Texts }
/** An extra that is asked for or not: `on` is `yes` or empty. */
export type Extra = Texts & { readonly on: string }
export const extraNames = ['brackets', 'stock', 'weld', 'code', 'volutes'] as const
export type ExtraName = (typeof extraNames)[number]

export interface Measure extends Readonly<Record<ExtraName, Extra>> {
  readonly hand: string
  readonly railHeight: string
  readonly section: Texts
  /** In climbing order. */
  readonly flights: readonly FlightTexts[]
  /** One between each two flights. */
  readonly landings: readonly Texts[]
  readonly bottom: EndTexts
  readonly top: EndTexts
}

/** Steps of a path: `flights[1].rise` → flights, 1, rise. */
const stepsOf = (path: string) => path.match(/[^.[\]]+/g) ?? []

/** What is typed at a path; nothing where nothing stands. */
export function textAt(measure: Measure, path: string): string {
  let at: unknown = measure
  for (const step of stepsOf(path)) {
    at = typeof at === 'object' && at !== null ? (at as Record<string, unknown>)[step] : undefined
  }
  return typeof at === 'string' ? at : ''
}

/** The measure with another text at a path. */
export function withText(measure: Measure, path: string, text: string): Measure {
  return placed(measure as unknown as Tree, stepsOf(path), text) as unknown as Measure
}

function placed(tree: Tree | undefined, [step, ...rest]: readonly string[], text: string): Tree {
  if (step === undefined) return text
  if (Array.isArray(tree)) return tree.map((item: Tree, i) => (String(i) === step ? placed(item, rest, text) : item))
  const branch = typeof tree === 'object' ? (tree as { readonly [name: string]: Tree }) : {}
  return { ...branch, [step]: placed(branch[step], rest, text) }
}

/** Round and square stock has one size: it is asked for once. */
export const hasOneSize = ({ section }: Pick<Measure, 'section'>): boolean => section.shape !== 'rect'

export const noFlight: FlightTexts = { way: 'tape' }
const noExtra: Extra = { on: '' }

/** An empty field sheet: one flight by tape, round pipe still to be told. */
export const blankMeasure: Measure = {
  hand: 'L',
  railHeight: '',
  section: { shape: 'round' },
  flights: [noFlight],
  landings: [],
  bottom: { type: 'none', return: noExtra },
  top: { type: 'none', return: noExtra },
  brackets: { on: '', way: 'spaced' },
  stock: noExtra,
  weld: noExtra,
  code: noExtra,
  volutes: noExtra,
}
