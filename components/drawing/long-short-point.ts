import type { Drawing, LabelRequest, Show, Spot, Stroke } from '@/lib/drawing/sketch'
import { longPoint, nudged, outline, path, spot, tornEdge } from '@/lib/drawing/strokes'
import { degrees, inchesOnly, length, plain, word } from '@/lib/drawing/text'
import { longOnTop, type EndFace, type PieceDimensions, type PieceGiven } from '@/lib/trade/piece'

/** A piece longer than so many depths is broken, so that its ends stay large enough to read. */
const longest = 22

interface Corners {
  topA: Spot
  underA: Spot
  topB: Spot
  underB: Spot
  broken: boolean
}

function cornersOf(
  { depth, faceA, faceB, miterA, miterB }: PieceGiven,
  { centre, setbackA, setbackB }: PieceDimensions,
): Corners {
  const broken = centre > longest * depth
  const drawn = broken ? Math.max(longest * depth * 0.9, setbackA + setbackB + 6 * depth) : centre
  const leanA = (longOnTop((miterA ?? 0) > 0 ? faceA : 'square') * setbackA) / 2
  const leanB = (longOnTop((miterB ?? 0) > 0 ? faceB : 'square') * setbackB) / 2
  return {
    topA: spot(-leanA, depth),
    underA: spot(leanA, 0),
    topB: spot(drawn + leanB, depth),
    underB: spot(drawn - leanB, 0),
    broken,
  }
}

/** The piece in elevation with its lengths, long points filled. */
export const draw: Drawing<PieceGiven, PieceDimensions> = (given, solved, show) => {
  const at = cornersOf(given, solved)
  return { strokes: strokesOf(given, at), labels: labelsOf(given, solved, show, at), says: saysOf(given, solved, show) }
}

function strokesOf(
  { depth, miterA, miterB, faceA, faceB }: PieceGiven,
  { topA, underA, topB, underB, broken }: Corners,
): Stroke[] {
  const middle = (topA.x + underA.x + topB.x + underB.x) / 4
  const torn = (shift: number) => [spot(middle + shift, depth), spot(middle + shift, 0)] as const
  const [leftTop, leftUnder] = torn(-0.5 * depth)
  const [rightTop, rightUnder] = torn(0.5 * depth)
  const bars = broken
    ? [
        outline('object', [topA, underA, ...tornEdge(leftUnder, leftTop)], 'face'),
        outline('object', [underB, topB, ...tornEdge(rightTop, rightUnder)], 'face'),
      ]
    : [outline('object', [topA, topB, underB, underA], 'face')]
  return [
    ...bars,
    ...centreStub(topA, underA, 180),
    ...centreStub(topB, underB, 0),
    ...endStrokes(topA, underA, miterA ?? 0, faceA),
    ...endStrokes(topB, underB, miterB ?? 0, faceB),
  ]
}

/** The centre line where it leaves the end; inside the piece it would only be in the way. */
function centreStub(top: Spot, under: Spot, way: number): Stroke[] {
  const end = spot((top.x + under.x) / 2, (top.y + under.y) / 2)
  return [path('centre', [end, nudged(end, way, 14)])]
}

function endStrokes(top: Spot, under: Spot, miter: number, face: EndFace): Stroke[] {
  if (miter === 0 || face === 'square') return []
  const steep = (Math.atan2(top.y - under.y, top.x - under.x) * 180) / Math.PI
  return [
    path('cut', [nudged(top, steep, 20), nudged(under, steep + 180, 20)]),
    face === 'top' ? longPoint(top, 90) : longPoint(under, -90),
  ]
}

function labelsOf(
  given: PieceGiven,
  solved: PieceDimensions,
  show: Show,
  { topA, underA, topB, underB }: Corners,
): LabelRequest[] {
  const left = topA.x < underA.x ? topA : underA
  const right = topB.x > underB.x ? topB : underB
  const middle = given.depth / 2
  const isMitered = solved.setbackA > 0 || solved.setbackB > 0
  return [
    {
      kind: 'dimension',
      text: [[...length(solved.topEdge, show), word(' top edge')]],
      size: 'number',
      from: topA,
      to: topB,
      side: 'left',
      offset: 34,
      required: true,
    },
    {
      kind: 'dimension',
      text: [[...length(solved.underside, show), word(' underside')]],
      size: 'number',
      from: underA,
      to: underB,
      side: 'right',
      offset: 34,
      required: true,
    },
    {
      kind: 'dimension',
      text: [[...length(solved.overall, show), word(' overall')]],
      size: 'number',
      from: spot(left.x, 0),
      to: spot(right.x, 0),
      side: 'right',
      offset: 78,
      required: true,
    },
    ...(isMitered
      ? [
          {
            kind: 'dimension',
            text: [[...length(solved.centre, show), word(' centre')]],
            size: 'number',
            from: spot((topA.x + underA.x) / 2, middle),
            to: spot((topB.x + underB.x) / 2, middle),
            side: 'left',
            offset: 90,
            required: false,
          } as const,
        ]
      : []),
    ...endLabel(spot((topA.x + underA.x) / 2, middle), given.miterA ?? 0, 0),
    ...endLabel(spot((topB.x + underB.x) / 2, middle), given.miterB ?? 0, 180),
    {
      kind: 'at',
      text: [[...inchesOnly(given.depth, show), word(' deep')]],
      size: 'note',
      spot: nudged(spot(left.x, 0), -90, 20),
      prefer: [180, -150, -120],
      gap: 10,
      required: false,
    },
  ]
}

function endLabel(end: Spot, miter: number, way: number): LabelRequest[] {
  const text = miter === 0 ? [[word('square')]] : [degrees(miter, 2, 'cut')]
  return [
    {
      kind: 'at',
      text,
      size: 'number',
      spot: end,
      prefer: [way, way + 180],
      gap: 12,
      reach: 60,
      required: true,
      leader: false,
    },
  ]
}

function saysOf(given: PieceGiven, solved: PieceDimensions, show: Show): string {
  const end = (name: string, miter: number, face: EndFace) =>
    miter === 0 || face === 'square'
      ? `${name} end square.`
      : `${name} end ${plain([degrees(miter, 2)])}, long ${face === 'top' ? 'on top' : 'underneath'}.`
  return [
    `A piece ${plain([inchesOnly(given.depth, show)])} deep: top edge ${plain([length(solved.topEdge, show)])}, underside ${plain([length(solved.underside, show)])}, centre ${plain([length(solved.centre, show)])}, overall ${plain([length(solved.overall, show)])}.`,
    end('Low', given.miterA ?? 0, given.faceA),
    end('High', given.miterB ?? 0, given.faceB),
  ].join(' ')
}
