import { mirror } from '@/lib/drawing/mirror'
import type { Drawing, Sketch } from '@/lib/drawing/sketch'
import type { HandrailInputs, HandrailOutputs } from '@/lib/trade/rail/types'
import { bracketLabels, bracketStrokes } from './handrail-brackets'
import { edgeLabels, jointLabels, jointStrokes, markLabels, partStrokes } from './handrail-parts'
import { stairLabels, stairStrokes } from './handrail-stair'
import { saysOf } from './handrail-words'

/**
 * The whole rail in elevation over its stair, seen from the room: parts, knuckles, brackets, heights.
 * A left hand rail climbs to the right, a right hand one to the left.
 */
export const draw: Drawing<HandrailInputs, HandrailOutputs> = (given, solved, show) => {
  const sketch: Sketch = {
    strokes: [...stairStrokes(solved), ...partStrokes(solved), ...bracketStrokes(solved), ...jointStrokes(solved)],
    labels: [
      ...edgeLabels(solved, show),
      ...jointLabels(solved, show),
      ...markLabels(solved, show),
      ...stairLabels(given, solved, show),
      ...bracketLabels(solved, show),
    ],
    says: saysOf(solved, show),
  }
  return solved.hand === 'R' ? mirror(sketch) : sketch
}
