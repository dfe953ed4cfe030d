import type { Drawing, LabelRequest, Show, Spot } from '@/lib/drawing/sketch'
import { angleArc, longPoint, nudged, outline, path, spot, tornEdge, toward } from '@/lib/drawing/strokes'
import { degrees, dial, length, plain, shape, word } from '@/lib/drawing/text'
import { cosDeg } from '@/lib/trade/angles'
import type { MiterAnswer } from '@/lib/trade/miter'

interface Given {
  slopeBelow: number
  slopeAbove: number
  depth: number
}

/** The four corners that matter, inches from the top corner of the joint. */
function jointOf({ slopeBelow, slopeAbove, depth }: Given, solved: MiterAnswer) {
  const face = (slopeBelow + slopeAbove) / 2 - 90
  const top = spot(0, 0)
  const under = toward(top, face, depth / cosDeg(solved.miter))
  // Long enough to read as bars, short enough that the joint stays large.
  const reach = depth * 6.5
  return { face, top, under, reach }
}

/** Two bars, the cut through both corners, both saw readings, the long point. */
export const draw: Drawing<Given, MiterAnswer> = (given, solved, show) => {
  const { slopeBelow, slopeAbove, depth } = given
  const { face, top, under, reach } = jointOf(given, solved)
  const lowTop = toward(top, slopeBelow + 180, reach)
  const lowUnder = toward(lowTop, slopeBelow - 90, depth)
  const highTop = toward(top, slopeAbove, reach)
  const highUnder = toward(highTop, slopeAbove - 90, depth)
  const middle = spot(under.x / 2, under.y / 2)
  const onTop = solved.longPointFace !== 'underside'
  const long = onTop ? top : under
  const bends = solved.bend > 0.05
  return {
    strokes: [
      outline('object', [top, under, ...tornEdge(lowUnder, lowTop)], 'face'),
      outline('object', [under, top, ...tornEdge(highTop, highUnder)], 'face'),
      path('cut', [nudged(top, face + 180, 40), nudged(under, face, 40)]),
      ...(bends ? [longPoint(long, onTop ? 90 : -90, undefined, 14)] : []),
      ...(bends ? bendArc(middle, given) : []),
      ...slopeArc(lowUnder, slopeBelow),
      ...slopeArc(under, slopeAbove, depth * 2),
    ],
    labels: labelsOf(given, solved, show, { top, under, middle, lowTop, lowUnder, highTop, long, face, onTop, bends }),
    says: saysOf(given, solved, show),
  }
}

/** The lower bar run on past the knuckle, and the turn away from it. */
function bendArc(middle: Spot, { slopeBelow, slopeAbove }: Given) {
  return [
    path('centre', [middle, nudged(middle, slopeBelow, 176)]),
    angleArc(middle, 150, Math.min(slopeBelow, slopeAbove), Math.max(slopeBelow, slopeAbove)),
  ]
}

/** A level line and the angle of the bar above it. */
function slopeArc(corner: Spot, slope: number, along = 0) {
  if (Math.abs(slope) < 0.5) return []
  const at = toward(corner, slope, along)
  return [path('ext', [nudged(at, 0, 8), nudged(at, 0, 112)]), angleArc(at, 96, Math.min(0, slope), Math.max(0, slope))]
}

interface Places {
  top: Spot
  under: Spot
  middle: Spot
  lowTop: Spot
  lowUnder: Spot
  highTop: Spot
  long: Spot
  face: number
  onTop: boolean
  bends: boolean
}

function labelsOf(given: Given, solved: MiterAnswer, show: Show, at: Places): LabelRequest[] {
  const { slopeBelow, slopeAbove, depth } = given
  const full = show.detail === 'full'
  const cutEnd = nudged(at.under, at.face, 40)
  const slopeLabel = (corner: Spot, slope: number): LabelRequest[] =>
    Math.abs(slope) < 0.5
      ? []
      : [
          {
            kind: 'at',
            text: [degrees(slope, 1)],
            size: 'number',
            spot: nudged(corner, slope / 2, 96),
            prefer: [slope / 2, 0, 20, -20],
            gap: 8,
            required: full,
          },
        ]
  return [
    {
      kind: 'at',
      text: [
        [word('saw ', 'cut'), ...dial(solved.sawSquareIs0, show, 'cut')],
        [word('or '), ...dial(solved.sawSquareIs90, show, 'quiet'), word(' where square reads 90')],
      ],
      size: 'answer',
      spot: cutEnd,
      prefer: [-45, 0, -90, -135],
      gap: 6,
      required: true,
    },
    ...slopeLabel(at.lowUnder, slopeBelow),
    ...slopeLabel(toward(at.under, slopeAbove, depth * 2), slopeAbove),
    ...(at.bends
      ? [
          {
            kind: 'at',
            text: [[word('bend '), ...degrees(solved.bend, 1)]],
            size: 'number',
            spot: nudged(at.middle, (slopeBelow + slopeAbove) / 2, 150),
            prefer: [(slopeBelow + slopeAbove) / 2, 0, 30],
            gap: 8,
            required: full,
          } as const,
          {
            kind: 'at',
            text: [[word(at.onTop ? 'long on top' : 'long underneath', 'cut')]],
            size: 'number',
            spot: nudged(at.long, at.onTop ? 90 : -90, 14),
            prefer: at.onTop ? [45, 135, 0, 180] : [-45, -135, 0, 180],
            gap: 6,
            required: true,
          } as const,
          ...setbackOf(given, solved, show, at),
        ]
      : []),
    {
      kind: 'along',
      text: [[word('UP '), shape('arrow', 'quiet')]],
      size: 'number',
      from: at.lowTop,
      to: at.top,
      side: 'above',
      gap: 12,
      required: true,
    },
    {
      kind: 'dimension',
      text: [length(depth, show)],
      size: 'number',
      from: at.lowTop,
      to: at.lowUnder,
      side: 'right',
      required: false,
      offset: 30,
    },
  ]
}

/** Long point to short point, along the long face of the lower bar. */
function setbackOf({ slopeBelow }: Given, solved: MiterAnswer, show: Show, at: Places): LabelRequest[] {
  const foot = toward(at.long, slopeBelow + 180, solved.setback)
  return [
    {
      kind: 'dimension',
      text: [[...length(solved.setback, show), word(' each')]],
      size: 'number',
      from: foot,
      to: at.long,
      side: at.onTop ? 'left' : 'right',
      offset: 46,
      required: show.detail === 'full' && solved.setback > 1 / 16,
    },
  ]
}

function saysOf(given: Given, solved: MiterAnswer, show: Show): string {
  const face = {
    top: 'Long point on top of both pieces.',
    underside: 'Long point underneath on both pieces.',
    none: 'The line does not bend.',
  }
  return [
    `A bar at ${plain([degrees(given.slopeBelow, 1)])} meets a bar at ${plain([degrees(given.slopeAbove, 1)])}, both ${plain([length(given.depth, show)])} deep.`,
    `Saw ${plain([dial(solved.sawSquareIs0, show)])} off square, which is ${plain([dial(solved.sawSquareIs90, show)])} where square reads 90.`,
    face[solved.longPointFace],
    `Each piece loses ${plain([length(solved.setback, show)])} from long point to short point.`,
  ].join(' ')
}
