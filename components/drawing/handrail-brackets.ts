import type { LabelRequest, Show, Spot, Stroke } from '@/lib/drawing/sketch'
import { nudged, path, toward } from '@/lib/drawing/strokes'
import { length } from '@/lib/drawing/text'
import type { HandrailOutputs } from '@/lib/trade/rail/types'
import { at } from './handrail-parts'

interface Bracket {
  part: string
  /** Where it meets the underside. */
  foot: Spot
  /** Its running mark on the underside from the part's low end. */
  mark: number
  tooClose: boolean
}

const stem = 12
/** Beyond so many the marks crowd the drawing; the part list has them all. */
const mostMarked = 12

function bracketsOf({ brackets = [], parts }: HandrailOutputs): Bracket[] {
  const placed = (part: string, mark: number, tooClose: boolean): Bracket[] => {
    const bar = parts.find((p) => p.mark === part)
    return bar ? [{ part, mark, tooClose, foot: toward(at(bar.corners.undersideA), bar.slope, mark) }] : []
  }
  return brackets.flatMap((row) => {
    if ('off' in row) return []
    if ('n' in row) return placed(row.part, row.alongUndersideFromLowEnd, row.tooCloseToJoint)
    return row.alongUndersideFromLowEnd.flatMap((mark) => placed(row.part, mark, false))
  })
}

/** A short stem under the bar at each bracket; red where it stands too near a knuckle. */
export function bracketStrokes(solved: HandrailOutputs): Stroke[] {
  return bracketsOf(solved).flatMap(({ foot, part, tooClose }) => {
    const ink = tooClose ? 'off' : 'dim'
    return [
      path(ink, [foot, nudged(foot, -90, stem)], { part }),
      path(ink, [nudged(nudged(foot, -90, stem), 180, 4), nudged(nudged(foot, -90, stem), 0, 4)], { part }),
    ]
  })
}

/** Running marks along the underside, where there is room. */
export function bracketLabels(solved: HandrailOutputs, show: Show): LabelRequest[] {
  const all = bracketsOf(solved)
  if (show.detail === 'compact' || all.length > mostMarked) return []
  return all.map(({ foot, part, mark, tooClose }) => ({
    kind: 'at',
    text: [length(mark, show, tooClose ? 'off' : 'quiet')],
    size: 'note',
    part,
    required: false,
    spot: nudged(foot, -90, stem),
    prefer: [-70, -90, -50, -110],
    gap: 4,
    reach: 14,
    worth: 0.6,
  }))
}
