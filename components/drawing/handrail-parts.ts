import type { LabelRequest, Show, Spot, Stroke } from '@/lib/drawing/sketch'
import { longPoint, nudged, outline, path, spot } from '@/lib/drawing/strokes'
import { dial, length, word } from '@/lib/drawing/text'
import type { HandrailOutputs, Point, RailPart } from '@/lib/trade/rail/types'

export const at = ({ x, y }: Point): Spot => spot(x, y)

/** The bars, and what a volute takes over from them. */
export function partStrokes({ parts, topLine }: HandrailOutputs): Stroke[] {
  const bars = parts.map(({ corners, mark }) =>
    outline('object', [at(corners.topA), at(corners.topB), at(corners.undersideB), at(corners.undersideA)], 'face', {
      part: mark,
    }),
  )
  const ends = [
    [topLine[0], parts[0]?.corners.topA],
    [topLine.at(-1), parts.at(-1)?.corners.topB],
  ] as const
  const volutes = ends.flatMap(([line, bar]) =>
    line && bar && Math.hypot(line.x - bar.x, line.y - bar.y) > 0.1 ? [path('centre', [at(line), at(bar)])] : [],
  )
  return [...bars, ...volutes]
}

interface Knuckle {
  below: RailPart
  above: RailPart
  /** Direction of the joint face from its top corner down, degrees. */
  face: number
  longOnTop: boolean
  bends: boolean
  saw: number
}

function knucklesOf({ parts, joints }: HandrailOutputs): Knuckle[] {
  return joints.flatMap((joint, i) => {
    const below = parts[i]
    const above = parts[i + 1]
    if (!below || !above) return []
    const face = (below.slope + above.slope) / 2 - 90
    return [
      {
        below,
        above,
        face,
        longOnTop: joint.longPointFace === 'top',
        bends: joint.longPointFace !== 'none',
        saw: joint.sawSquareIs0,
      },
    ]
  })
}

const topReach = 15
const underReach = 17

/** At each knuckle the cut through both corners, and a triangle on the long point. */
export function jointStrokes(solved: HandrailOutputs): Stroke[] {
  return knucklesOf(solved).flatMap(({ below, face, longOnTop, bends }) => {
    const { topB, undersideB } = below.corners
    const cut = path('cut', [nudged(at(topB), face + 180, topReach), nudged(at(undersideB), face, underReach)])
    if (!bends) return [cut]
    return [cut, longOnTop ? longPoint(at(topB), 90) : longPoint(at(undersideB), -90)]
  })
}

/** The saw at each knuckle, under it: the room above is for the lengths. */
export function jointLabels(solved: HandrailOutputs, show: Show): LabelRequest[] {
  return knucklesOf(solved).map(({ below, face, saw }) => ({
    kind: 'at',
    text: [dial(saw, show, 'cut')],
    size: 'number',
    required: true,
    gap: 4,
    spot: nudged(at(below.corners.undersideB), face, underReach),
    prefer: [-60, -120, -90, -30, -150],
  }))
}

/** Top edge of each part as the tape reads it; long parts first, for a short one can put its words past its end. */
export function edgeLabels({ parts }: HandrailOutputs, show: Show): LabelRequest[] {
  return parts.toSorted((a, b) => b.topEdge - a.topEdge).map((part) => edgeLabel(part, show.detail === 'full', show))
}

/** The mark of each part in its disc. */
export function markLabels({ parts }: HandrailOutputs, show: Show): LabelRequest[] {
  return parts.map((part) => markLabel(part, show.detail === 'full'))
}

/** What turns to the wall at an end, seen end on: its own length is said, for the elevation cannot show it. */
export function returnLabels({ returns, parts }: HandrailOutputs, show: Show): LabelRequest[] {
  return returns.flatMap((turned): LabelRequest[] => {
    const part = turned.end === 'bottom' ? parts[0] : parts.at(-1)
    if (!part) return []
    const { topA, undersideA, topB, undersideB } = part.corners
    const [top, under] = turned.end === 'bottom' ? [topA, undersideA] : [topB, undersideB]
    const out = turned.end === 'bottom' ? 180 : 0
    return [
      {
        kind: 'at',
        size: 'note',
        required: false,
        worth: 8,
        part: part.mark,
        gap: 8,
        reach: 60,
        text: [[word('return '), ...length(turned.longPoint, show, 'quiet')]],
        spot: spot((top.x + under.x) / 2, (top.y + under.y) / 2),
        prefer: [out, out === 0 ? -45 : -135, -90, 90],
      },
    ]
  })
}

function edgeLabel(part: RailPart, full: boolean, show: Show): LabelRequest {
  const { topA, topB, undersideA, undersideB } = part.corners
  const shared = {
    text: [length(part.topEdge, show)],
    size: 'number',
    from: at(topA),
    to: at(topB),
    required: full,
    part: part.mark,
  } as const
  if (!full) return { ...shared, kind: 'along', side: 'above', gap: 6 }
  // Over a bottom level run the first rake's own dimension leans in, so its dimension hangs under it.
  const under = part.kind === 'bottom level'
  const ends = under ? { from: spot(topA.x, undersideA.y), to: spot(topB.x, undersideB.y) } : {}
  return { ...shared, ...ends, kind: 'dimension', side: under ? 'right' : 'left', offset: under ? 34 : 28, tries: 8 }
}

function markLabel({ mark, corners }: RailPart, full: boolean): LabelRequest {
  return {
    kind: 'along',
    text: [[{ kind: 'word', text: mark, ink: 'text' }]],
    size: 'note',
    badge: 'disc',
    required: true,
    part: mark,
    from: at(corners.topA),
    to: at(corners.topB),
    side: 'above',
    gap: full ? 30 : 6,
    reach: 60,
  }
}
