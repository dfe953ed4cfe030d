import type { Show } from '@/lib/drawing/sketch'
import { degrees, dial, length, plain } from '@/lib/drawing/text'
import type { HandrailOutputs, PartEnd, RailPart } from '@/lib/trade/rail/types'

/** The rail in words, part by part in climbing order. */
export function saysOf({ hand, parts, brackets, pitches, topLine }: HandrailOutputs, show: Show): string {
  const pitchWords = pitches.map((pitch) => plain([degrees(pitch, 2)])).join(', ')
  const [low, high] = [topLine[0], topLine.at(-1)]
  const level =
    low && high
      ? `It runs ${plain([length(high.x - low.x, show)])} level and climbs ${plain([length(high.y - low.y, show)])}.`
      : ''
  return [
    `${hand === 'L' ? 'Left' : 'Right'} hand rail going up, in elevation. Pitch ${pitchWords}.`,
    level,
    ...parts.map((part) => partWords(part, show)),
    brackets && brackets.length > 0 ? 'Brackets are marked on the underside.' : '',
  ]
    .filter(Boolean)
    .join(' ')
}

function partWords(part: RailPart, show: Show): string {
  return `${part.mark}, ${part.kind}: top edge ${plain([length(part.topEdge, show)])}, low end ${endWords(part.endA, show)}, high end ${endWords(part.endB, show)}.`
}

function endWords({ saw, longPoint }: PartEnd, show: Show): string {
  if (longPoint === 'square') return 'square'
  const face = {
    top: 'long on top',
    underside: 'long underneath',
    'room side (plan)': 'long on the room side, cut in plan',
  }[longPoint]
  return `saw ${plain([dial(saw, show)])}, ${face}`
}
