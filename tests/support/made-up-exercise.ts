import type { AnyGivens, Exercise, Measure } from '@/lib/exercises/exercise'
import type { SlipCode } from '@/lib/exercises/slips'

/** An exercise with one number to give, for judging alone: its answer and slips are as the test says. */
export const numberExercise = (
  measure: Measure,
  right: number,
  slips: readonly (readonly [SlipCode, number | null])[],
): Exercise<AnyGivens> => ({
  id: 'made-up/number',
  revision: 1,
  kind: 'number',
  asks: 'How much?',
  gives: ['unitRise'],
  drawGivens: ({ step }) => ({ unitRise: step(6, 8, 1 / 8) }),
  parts: [
    {
      kind: 'number',
      asks: 'How much',
      measure,
      solve: () => right,
      slips: slips.map(([code, value]) => ({ code, wrong: () => value })),
    },
  ],
})
