import type { LabelRequest, Show, Spot } from '@/lib/drawing/sketch'
import { nudged, toward } from '@/lib/drawing/strokes'
import { degrees, dial, length, shape, word } from '@/lib/drawing/text'
import type { MiterAnswer } from '@/lib/trade/miter'

export interface Given {
  slopeBelow: number
  slopeAbove: number
  depth: number
}

/** Px on paper. */
export const bendRadius = 150
export const slopeRadius = 96
export const cutReach = ({ detail }: Show) => (detail === 'full' ? 40 : 22)

export interface Places {
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

/** The saw and the long point always; on a wide plate the angles, what is lost, and the depth besides. */
export function labelsOf(given: Given, solved: MiterAnswer, show: Show, at: Places): LabelRequest[] {
  const always = [sawLabel(solved, show, at), ...longPointLabel(at), upLabel(at)]
  if (show.detail === 'compact') return always
  return [
    ...always.slice(0, 1),
    ...slopeLabel(at.lowUnder, given.slopeBelow),
    ...slopeLabel(toward(at.under, given.slopeAbove, given.depth * 2), given.slopeAbove),
    ...(at.bends ? bendLabel(given, solved, at) : []),
    ...(at.bends ? setbackOf(given, solved, show, at) : []),
    ...always.slice(1),
    {
      kind: 'dimension',
      text: [length(given.depth, show)],
      size: 'number',
      from: at.lowTop,
      to: at.lowUnder,
      side: 'right',
      required: false,
      offset: 30,
    },
  ]
}

function sawLabel(solved: MiterAnswer, show: Show, at: Places): LabelRequest {
  const reading = [word('saw ', 'cut'), ...dial(solved.sawSquareIs0, show, 'cut')]
  const other = [word('or '), ...dial(solved.sawSquareIs90, show, 'quiet'), word(' where square reads 90')]
  return {
    kind: 'at',
    text: show.detail === 'full' ? [reading, other] : [reading],
    size: 'answer',
    required: true,
    spot: nudged(at.under, at.face, cutReach(show)),
    prefer: [-45, 0, -90, -135],
    gap: 6,
  }
}

function longPointLabel(at: Places): LabelRequest[] {
  if (!at.bends) return []
  return [
    {
      kind: 'at',
      text: [[word(at.onTop ? 'long on top' : 'long underneath', 'cut')]],
      size: 'number',
      required: true,
      spot: nudged(at.long, at.onTop ? 90 : -90, 14),
      prefer: at.onTop ? [45, 135, 0, 180] : [-45, -135, 0, 180],
      gap: 6,
    },
  ]
}

function upLabel({ lowTop, top }: Places): LabelRequest {
  return {
    kind: 'along',
    text: [[word('UP '), shape('arrow', 'quiet')]],
    size: 'number',
    from: lowTop,
    to: top,
    side: 'above',
    gap: 12,
    required: true,
  }
}

function slopeLabel(corner: Spot, slope: number): LabelRequest[] {
  if (Math.abs(slope) < 0.5) return []
  return [
    {
      kind: 'at',
      text: [degrees(slope, 1)],
      size: 'number',
      spot: nudged(corner, slope / 2, slopeRadius),
      prefer: [slope / 2, 0, 20, -20],
      gap: 8,
      required: true,
    },
  ]
}

function bendLabel({ slopeBelow, slopeAbove }: Given, solved: MiterAnswer, at: Places): LabelRequest[] {
  const half = (slopeBelow + slopeAbove) / 2
  return [
    {
      kind: 'at',
      text: [[word('bend '), ...degrees(solved.bend, 1)]],
      size: 'number',
      spot: nudged(at.middle, half, bendRadius),
      prefer: [half, 0, 30],
      gap: 8,
      required: true,
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
      required: solved.setback > 1 / 16,
    },
  ]
}
