import { mirror } from '@/lib/drawing/mirror'
import type { Drawing, Sketch } from '@/lib/drawing/sketch'
import type { HandrailInputs, HandrailOutputs } from '@/lib/trade/rail/types'
import { bracketLabels, bracketStrokes } from './handrail-brackets'
import { edgeLabels, jointLabels, jointStrokes, markLabels, partStrokes, returnLabels } from './handrail-parts'
import { heightLabels, stairLabels, stairStrokes } from './handrail-stair'
import { saysOf } from './handrail-words'

/**
 * The whole rail in elevation over its stair, seen from the room: parts, knuckles, brackets, heights.
 * A left hand rail climbs to the right, a right hand one to the left.
 */
export const draw: Drawing<HandrailInputs, HandrailOutputs> = (given, solved, show) => {
  const full = show.detail === 'full'
  const sketch: Sketch = {
    strokes: [...stairStrokes(solved), ...partStrokes(solved), ...bracketStrokes(solved), ...jointStrokes(solved)],
    labels: [
      ...edgeLabels(solved, show),
      ...(full ? heightLabels(solved, show) : []),
      ...jointLabels(solved, show),
      ...markLabels(solved, show),
      ...stairLabels(given, solved, show),
      ...(full ? returnLabels(solved, show) : []),
      ...bracketLabels(solved, show),
    ],
    says: saysOf(solved, show),
  }
  return solved.hand === 'R' ? mirror(sketch) : sketch
}
