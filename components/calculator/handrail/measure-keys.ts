import type { Way } from './measure'

/** Names of the texts of each block, in the order in which an address holds them: never to be reordered. */
export const flightKeys: Readonly<Record<Way, readonly string[]>> = {
  count: ['risers', 'rise', 'run'],
  rake: ['rake', 'pitch', 'firstRise', 'run'],
  tape: ['nosingRise', 'nosingRun', 'nosingRake', 'firstRise', 'run'],
}
export const bracketKeys: Readonly<Record<'spaced' | 'field', readonly string[]>> = {
  spaced: ['endDistance', 'maxSpacing'],
  field: ['field', 'jointClear'],
}
export const sectionKeys = ['shape', 'depth', 'width'] as const
export const landingKeys = ['length', 'slopeInPerFt', 'railHeight'] as const
export const returnKeys = ['clearance', 'gap'] as const
export const plainExtraKeys = {
  stock: ['length', 'kerf', 'trim'],
  weld: ['areaIn2', 'efficiency', 'lbPerHour', 'arcOnPct'],
  code: ['outsideDia', 'wallClearance'],
  volutes: ['bottom', 'top'],
} as const satisfies Record<string, readonly string[]>
export type PlainExtra = keyof typeof plainExtraKeys
export const plainExtras = Object.keys(plainExtraKeys) as PlainExtra[]

/** What each kind of end asks for besides. */
const endKeys: Readonly<Record<'bottom' | 'top', Readonly<Record<string, readonly string[]>>>> = {
  bottom: { none: [], slope: ['horizontal'], level: ['length', 'railHeight'] },
  top: { none: [], level: ['length', 'slopeInPerFt', 'railHeight'] },
}
export const endAsks = (end: 'bottom' | 'top', type: string): readonly string[] => endKeys[end][type] ?? []
export const allEndKeys = {
  bottom: ['type', 'horizontal', 'length', 'railHeight'],
  top: ['type', 'length', 'slopeInPerFt', 'railHeight'],
} as const
