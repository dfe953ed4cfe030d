/** A place in the symbol, px from its upper left corner, y down. */
type Spot = readonly [x: number, y: number]

interface SymbolShape {
  width: number
  height: number
  lines: readonly (readonly Spot[])[]
  circle: { at: Spot; radius: number }
  arrowhead: readonly Spot[]
  words: readonly { at: Spot; text: string; size: number; centred: boolean }[]
}

/**
 * Welding symbol of a mitered tube joint: square groove on the arrow side, all around, flush, ground; what is not drawn
 * is the shop's procedure, in the tail. Elements of AWS A2.4 and ISO 2553, from memory.
 */
export const tubeJointSymbol: SymbolShape = {
  width: 216,
  height: 46,
  lines: [
    [
      [12, 38],
      [44, 16],
      [138, 16],
    ],
    [
      [148, 6],
      [138, 16],
      [148, 26],
    ],
    [
      [86, 16],
      [86, 26],
    ],
    [
      [92, 16],
      [92, 26],
    ],
    [
      [80, 30],
      [98, 30],
    ],
  ],
  circle: { at: [44, 16], radius: 5 },
  arrowhead: [
    [4, 43.5],
    [10.3, 34.8],
    [14.2, 40.5],
  ],
  words: [
    { at: [89, 42], text: 'G', size: 11, centred: true },
    { at: [151, 20], text: 'shop procedure', size: 11, centred: false },
  ],
}
