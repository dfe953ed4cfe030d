import type { Drawing, LabelRequest, Show, Spot, Stroke } from '@/lib/drawing/sketch'
import { angleArc, longPoint, nudged, path, spot } from '@/lib/drawing/strokes'
import { degrees, inchesOnly, length, plain, shape, word } from '@/lib/drawing/text'
import { tanDeg } from '@/lib/trade/angles'
import type { KnuckleAnswer, KnuckleGiven } from '@/lib/trade/knuckle'
import { steps } from './steps'

/** Treads are drawn for the eye only: neither their number nor their run was given. */
const assumedRun = 11
const assumedSteps = 3
const levelShown = 20

/** Px on paper. */
const arcRadius = ({ detail }: Show) => (detail === 'full' ? 82 : 46)

interface Places {
  bottom: Spot
  top: Spot
  topKnuckle: Spot
  bottomKnuckle: Spot | null
  lowEnd: Spot
}

function placesOf(
  { pitch, rakeHeight, topLevelHeight, bottomLevelHeight, firstRise }: KnuckleGiven,
  solved: KnuckleAnswer,
): Places {
  const run = assumedRun * assumedSteps
  const top = spot(run, run * tanDeg(pitch))
  const before = solved.beforeBottomNosing
  const bottomKnuckle = before === null ? null : spot(-before, (bottomLevelHeight ?? 0) - (firstRise ?? 0))
  return {
    bottom: spot(0, 0),
    top,
    topKnuckle: spot(top.x + solved.pastTopNosing, top.y + topLevelHeight),
    bottomKnuckle,
    lowEnd: bottomKnuckle ?? spot(0, rakeHeight),
  }
}

/** Top lines crossing, over the nosings that they are measured from. */
export const draw: Drawing<KnuckleGiven, KnuckleAnswer> = (given, solved, show) => {
  const at = placesOf(given, solved)
  return {
    strokes: strokesOf(given, at, arcRadius(show)),
    labels: labelsOf(given, solved, show, at),
    says: saysOf(given, solved, show),
  }
}

function strokesOf(
  { pitch, rakeHeight, firstRise }: KnuckleGiven,
  { bottom, top, topKnuckle, bottomKnuckle, lowEnd }: Places,
  radius: number,
): Stroke[] {
  const floor = -(firstRise ?? assumedRun * tanDeg(pitch))
  const profile = steps({ x: 0, y: 0 }, assumedSteps + 1, assumedRun * tanDeg(pitch), assumedRun).slice(1, -1)
  const end = spot(Math.max(top.x, topKnuckle.x) + levelShown, topKnuckle.y)
  const start = bottomKnuckle ? [spot(Math.min(0, bottomKnuckle.x) - levelShown, bottomKnuckle.y)] : []
  const cornerRise = spot(0, floor)
  return [
    path('ghost', [spot((start[0]?.x ?? -8) - 2, floor), cornerRise, ...profile, spot(end.x + 2, top.y)]),
    path('object', [...start, lowEnd, topKnuckle, end]),
    path('centre', [bottom, spot(0, Math.max(rakeHeight, lowEnd.y), 0, 26)]),
    path('centre', [top, spot(top.x, Math.max(top.y + rakeHeight, topKnuckle.y), 0, 26)]),
    longPoint(topKnuckle, 90),
    ...(bottomKnuckle ? [longPoint(bottomKnuckle, -90)] : []),
    path('ext', [lowEnd, spot(lowEnd.x, lowEnd.y, radius + 14)]),
    angleArc(lowEnd, radius, 0, pitch),
  ]
}

function offsetLabel(off: number, nosing: Spot, knuckle: Spot, show: Show, side: 'left' | 'right'): LabelRequest[] {
  if (Math.abs(off) < 1 / 64) {
    return [
      {
        kind: 'at',
        text: [[word('plumb over the nosing', 'cut')]],
        size: 'number',
        spot: knuckle,
        prefer: [70, 110, 45],
        gap: 20,
        required: true,
      },
    ]
  }
  const [a, b] = [spot(nosing.x, knuckle.y), spot(knuckle.x, knuckle.y)]
  const [from, to] = a.x < b.x ? [a, b] : [b, a]
  return [
    {
      kind: 'dimension',
      text: [length(Math.abs(off), show, 'cut')],
      size: 'answer',
      from,
      to,
      side,
      measure: 'level',
      offset: 36,
      required: true,
    },
  ]
}

function labelsOf(given: KnuckleGiven, solved: KnuckleAnswer, show: Show, at: Places): LabelRequest[] {
  const { pitch, rakeHeight, topLevelHeight, bottomLevelHeight, firstRise } = given
  const before = solved.beforeBottomNosing
  const middle = spot(assumedRun * 2, assumedRun * 2 * tanDeg(pitch))
  const past = Math.max(at.top.x, at.topKnuckle.x) + levelShown * 0.7
  return [
    ...offsetLabel(solved.pastTopNosing, at.top, at.topKnuckle, show, 'left'),
    ...(at.bottomKnuckle && before !== null ? offsetLabel(before, at.bottom, at.bottomKnuckle, show, 'left') : []),
    {
      kind: 'dimension',
      text: [inchesOnly(rakeHeight, show)],
      size: 'number',
      from: middle,
      to: spot(middle.x, middle.y + rakeHeight),
      side: 'right',
      offset: 0,
      required: true,
    },
    {
      kind: 'dimension',
      text: [inchesOnly(topLevelHeight, show)],
      size: 'number',
      from: spot(past, at.top.y),
      to: spot(past, at.topKnuckle.y),
      side: 'right',
      offset: 0,
      required: true,
    },
    ...(at.bottomKnuckle && typeof bottomLevelHeight === 'number'
      ? [
          {
            kind: 'dimension',
            text: [inchesOnly(bottomLevelHeight, show)],
            size: 'number',
            from: spot(at.bottomKnuckle.x - 12, -(firstRise ?? 0)),
            to: spot(at.bottomKnuckle.x - 12, at.bottomKnuckle.y),
            side: 'left',
            offset: 0,
            required: true,
          } as const,
        ]
      : []),
    {
      kind: 'at',
      text: [degrees(pitch, 2)],
      size: 'number',
      spot: nudged(at.lowEnd, pitch / 2, arcRadius(show)),
      prefer: [pitch / 2, 0, -30],
      gap: 8,
      required: show.detail === 'full',
    },
    {
      kind: 'along',
      text: [[word('UP '), shape('arrow', 'quiet')]],
      size: 'number',
      from: spot(0, 0),
      to: at.top,
      side: 'below',
      gap: 26,
      reach: 80,
      required: false,
    },
  ]
}

function saysOf(
  { pitch, rakeHeight, topLevelHeight }: KnuckleGiven,
  { pastTopNosing, beforeBottomNosing }: KnuckleAnswer,
  show: Show,
): string {
  const off = (value: number) => (Math.abs(value) < 1 / 64 ? 'plumb over' : plain([length(Math.abs(value), show)]))
  const top = `At ${plain([degrees(pitch, 2)])}, ${plain([inchesOnly(rakeHeight, show)])} on the rake and ${plain([inchesOnly(topLevelHeight, show)])} on the level: the rake turns level ${off(pastTopNosing)} ${pastTopNosing < 0 ? 'before' : 'past'} the top nosing.`
  return beforeBottomNosing === null
    ? top
    : `${top} At the bottom it turns ${off(beforeBottomNosing)} ${beforeBottomNosing < 0 ? 'past' : 'in front of'} the bottom nosing.`
}
