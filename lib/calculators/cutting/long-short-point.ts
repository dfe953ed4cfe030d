import { pieceFrom } from '@/lib/trade/piece'
import { defineCalculator, type Shown } from '../define'
import { choice, degrees, inches } from '../fields'
import { onTape, words } from '../outputs'

const faces = ['top', 'underside', 'square'] as const
const faceNames = ['On top', 'Underneath', 'Square'] as const
const miter = { least: 0, most: 89, sane: [0, 45], fallback: 0, hint: 'Off square.' } as const

type Reference = 'top' | 'underside' | 'centre' | 'overall'
type Face = (typeof faces)[number]

const centreSays: Record<Reference, string> = {
  top: 'From the top edge back to the centre line: half of each setback, off or on.',
  underside: 'From the underside back to the centre line: half of each setback, off or on.',
  centre: 'The centre line is the known length.',
  overall: 'The centre line is the blank less half of each setback.',
}

/** What an end adds to the top edge (side 1) or takes off it (side -1), as a term of a formula. */
function half(end: 'A' | 'B', face: Face, side: 1 | -1): string {
  if (face === 'square') return ''
  return ` ${(face === 'top') === (side === 1) ? '+' : '-'} setback${end} / 2`
}

function centreFormula(ref: Reference, faceA: Face, faceB: Face): string {
  switch (ref) {
    case 'top':
      return `length${half('A', faceA, -1)}${half('B', faceB, -1)}`
    case 'underside':
      return `length${half('A', faceA, 1)}${half('B', faceB, 1)}`
    case 'centre':
      return 'length'
    case 'overall':
      return 'length - (setbackA + setbackB) / 2'
  }
}

/** Every length of one piece from any one of them. Inches and degrees. */
export const longShortPoint = defineCalculator({
  id: 'long-short-point',
  revision: 1,
  stage: 'cutting',
  name: 'Long point, short point, centre line and blank of one piece',
  asks: 'I know one edge; what are the others?',
  lede: 'Give one length of the piece and how each end is cut. Top, underside, centre line and blank follow.',
  alsoCalled: [
    'long point',
    'short point',
    'LP',
    'SP',
    'tip to tip',
    'heel',
    'toe',
    'setback',
    'blank length',
    'mitre length',
  ],
  example: {
    length: '156 7/16',
    ref: 'top',
    depth: '1 1/2',
    miterA: '0',
    faceA: 'square',
    miterB: '16.25',
    faceB: 'top',
  },
  inputs: {
    length: inches('Known length', { above: 0, most: 12_000 }),
    ref: choice('It is the', ['top', 'underside', 'centre', 'overall'], {
      names: ['Top edge', 'Underside', 'Centre line', 'Blank, tip to tip'],
    }),
    depth: inches('Depth, seen from the side', { above: 0, most: 24, symbol: 'd' }),
    miterA: degrees('Miter at the low end', { ...miter, symbol: 'm_A' }),
    faceA: choice('Long point at the low end', faces, { names: faceNames }),
    miterB: degrees('Miter at the high end', { ...miter, symbol: 'm_B' }),
    faceB: choice('Long point at the high end', faces, { names: faceNames }),
  },
  outputs: {
    centre: onTape('Centre line', { symbol: 'c' }),
    topEdge: onTape('Top edge'),
    underside: onTape('Underside'),
    overall: onTape('Blank, tip to tip'),
    setbackA: onTape('Low end loses', { symbol: 'k_A' }),
    setbackB: onTape('High end loses', { symbol: 'k_B' }),
    cuts: words('Between cuts'),
  },
  answer: 'overall',
  glance: ['overall', 'topEdge', 'underside', 'cuts'],
  solve: pieceFrom,
  shown: ({ ref, faceA, faceB }): Shown => ({
    setbackA: { says: 'Long point past short point at the low end.', formula: 'depth * tan(miterA)' },
    setbackB: { says: 'And at the high end.', formula: 'depth * tan(miterB)' },
    centre: { says: centreSays[ref], formula: centreFormula(ref, faceA, faceB) },
    topEdge: {
      says: 'The top gains half a setback where the long point is on it, and loses half where it is underneath.',
      formula: `centre${half('A', faceA, 1)}${half('B', faceB, 1)}`,
    },
    underside: {
      says: 'Top and underside lie the same amount either side of the centre line.',
      formula: '2 * centre - topEdge',
    },
    overall: {
      says: 'The blank reaches half a setback past the centre line at each end.',
      formula: 'centre + (setbackA + setbackB) / 2',
    },
  }),
  cautions: [
    {
      signal: 'caution',
      text: 'Parallel cuts: both edges equal the centre line. Long point to long point is then a diagonal; do not tape it.',
      beside: 'cuts',
      when: (_given, { cuts }) => cuts.startsWith('parallel'),
    },
    {
      signal: 'notice',
      text: 'Depth is the side you see from the side, whichever way the bar is rolled.',
      beside: 'depth',
    },
    {
      signal: 'notice',
      text: 'A molded cap cannot be rolled over: swing the saw’s head, or rest it on a block shaped to it.',
      beside: 'cuts',
    },
  ],
  sources: [
    {
      says: 'An end cut off square gains and loses half its setback about the centre line.',
      where: 'common practice (geometry), no published source',
    },
  ],
  related: ['miter', 'cut-list', 'saw-dial'],
  basis: 'common practice (geometry)',
})
