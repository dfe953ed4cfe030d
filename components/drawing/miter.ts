import type { Drawing, Show, Spot } from '@/lib/drawing/sketch'
import { angleArc, longPoint, nudged, outline, path, spot, tornEdge, toward } from '@/lib/drawing/strokes'
import { degrees, dial, length, plain } from '@/lib/drawing/text'
import { cosDeg } from '@/lib/trade/angles'
import type { MiterAnswer } from '@/lib/trade/miter'
import { bendRadius, cutReach, labelsOf, slopeRadius, type Given } from './miter-labels'

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
  const full = show.detail === 'full'
  return {
    strokes: [
      outline('object', [top, under, ...tornEdge(lowUnder, lowTop)], 'face'),
      outline('object', [under, top, ...tornEdge(highTop, highUnder)], 'face'),
      path('cut', [nudged(top, face + 180, cutReach(show)), nudged(under, face, cutReach(show))]),
      ...(bends ? [longPoint(long, onTop ? 90 : -90, undefined, 14)] : []),
      ...(full && bends ? bendArc(middle, given) : []),
      ...(full ? [...slopeArc(lowUnder, slopeBelow), ...slopeArc(under, slopeAbove, depth * 2)] : []),
    ],
    labels: labelsOf(given, solved, show, { top, under, middle, lowTop, lowUnder, highTop, long, face, onTop, bends }),
    says: saysOf(given, solved, show),
  }
}

/** The lower bar run on past the knuckle, and the turn away from it. */
function bendArc(middle: Spot, { slopeBelow, slopeAbove }: Given) {
  return [
    path('centre', [middle, nudged(middle, slopeBelow, bendRadius + 26)]),
    angleArc(middle, bendRadius, Math.min(slopeBelow, slopeAbove), Math.max(slopeBelow, slopeAbove)),
  ]
}

/** A level line and the angle of the bar above it. */
function slopeArc(corner: Spot, slope: number, along = 0) {
  if (Math.abs(slope) < 0.5) return []
  const at = toward(corner, slope, along)
  return [
    path('ext', [nudged(at, 0, 8), nudged(at, 0, slopeRadius + 16)]),
    angleArc(at, slopeRadius, Math.min(0, slope), Math.max(0, slope)),
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
