import type { LabelRequest, Show, Stroke } from '@/lib/drawing/sketch'
import { path, spot } from '@/lib/drawing/strokes'
import { degrees, inchesOnly, length, number, shape, word } from '@/lib/drawing/text'
import type { HandrailInputs, HandrailOutputs, Point } from '@/lib/trade/rail/types'
import { at } from './handrail-parts'

/** The stair as a ghost, dashed where its treads were not measured. */
export function stairStrokes({ stair }: HandrailOutputs): Stroke[] {
  return stair.map(({ points, assumed }) => path(assumed ? 'centre' : 'ghost', points.map(at)))
}

/** The bottom and the top nosing, each with the rail plumb over it. */
function plumbLines({ nosings, topLine }: HandrailOutputs): { nosing: Point; rail: Point }[] {
  const ends = [nosings[0]?.[0], nosings.at(-1)?.at(-1)]
  return ends.flatMap((nosing) => {
    const y = nosing && heightAt(topLine, nosing.x)
    return nosing && y !== undefined ? [{ nosing, rail: { x: nosing.x, y } }] : []
  })
}

/** Height of the top line over a place, or undefined where the rail does not reach. */
function heightAt(line: readonly Point[], x: number): number | undefined {
  for (let i = 1; i < line.length; i++) {
    const a = line[i - 1]
    const b = line[i]
    if (a && b && x >= a.x - 1e-6 && x <= b.x + 1e-6 && b.x > a.x) return a.y + ((b.y - a.y) * (x - a.x)) / (b.x - a.x)
  }
  return undefined
}

/** Heights, pitches, the way up, the hand, and how far the end knuckles stand off their nosings. */
export function stairLabels(given: HandrailInputs, solved: HandrailOutputs, show: Show): LabelRequest[] {
  const full = show.detail === 'full'
  return [...hand(solved, full), ...wayUp(solved), ...(full ? [...offsets(solved, show), ...pitches(solved)] : [])]
}

function hand({ hand: side, topLine }: HandrailOutputs, full: boolean): LabelRequest[] {
  const low = topLine[0]
  const high = topLine.at(-1)
  if (!low || !high) return []
  // A rail climbs: the corner over its low end is the one free place of every such drawing.
  const corner = spot(low.x, high.y)
  return [
    {
      kind: 'at',
      text: [[number(side), word(full ? ' hand, going UP' : ' hand')]],
      size: 'answer',
      spot: corner,
      prefer: [-40, -70, -20, 0, 90],
      gap: 0,
      required: true,
      leader: false,
    },
  ]
}

function wayUp({ nosings }: HandrailOutputs): LabelRequest[] {
  const first = nosings[0]
  const [from, to] = [first?.[0], first?.at(-1)]
  if (!from || !to) return []
  return [
    {
      kind: 'along',
      text: [[word('UP '), shape('arrow', 'quiet')]],
      size: 'number',
      from: at(from),
      to: at(to),
      side: 'below',
      gap: 22,
      reach: 60,
      required: true,
    },
  ]
}

/** Rail height at the bottom and the top nosing, plumb. */
export function heightLabels(solved: HandrailOutputs, show: Show): LabelRequest[] {
  return plumbLines(solved).map(({ nosing, rail }, i) => ({
    kind: 'dimension',
    text: [inchesOnly(rail.y - nosing.y, show)],
    size: 'number',
    from: at(nosing),
    to: at(rail),
    side: 'right',
    offset: 0,
    tries: 1,
    required: i === 0,
  }))
}

function offsets({ knuckles, nosings, topLine }: HandrailOutputs, show: Show): LabelRequest[] {
  const ends = [
    { off: knuckles.fromBottomNosing, nosing: nosings[0]?.[0], side: 'right' },
    { off: knuckles.fromTopNosing, nosing: nosings.at(-1)?.at(-1), side: 'right' },
  ] as const
  return ends.flatMap(({ off, nosing, side }): LabelRequest[] => {
    if (off === null || !nosing || Math.abs(off) < 1 / 32) return []
    const y = heightAt(topLine, nosing.x + off)
    if (y === undefined) return []
    const [left, right] = off > 0 ? [nosing.x, nosing.x + off] : [nosing.x + off, nosing.x]
    return [
      {
        kind: 'dimension',
        text: [length(Math.abs(off), show)],
        size: 'note',
        from: spot(left, y),
        to: spot(right, y),
        side,
        measure: 'level',
        offset: 34,
        required: false,
      },
    ]
  })
}

function pitches({ pitches: slopes, nosings }: HandrailOutputs): LabelRequest[] {
  return nosings.flatMap((flight, i): LabelRequest[] => {
    const [from, to] = [flight[0], flight.at(-1)]
    const slope = slopes[i]
    if (!from || !to || slope === undefined) return []
    return [
      {
        kind: 'along',
        text: [[...degrees(slope, 2), word(' pitch')]],
        size: 'note',
        from: at(from),
        to: at(to),
        side: 'above',
        gap: 8,
        reach: 40,
        required: false,
      },
    ]
  })
}
