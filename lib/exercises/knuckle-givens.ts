import type { Knuckle } from './exercise'
import type { Draws } from './seed'

/** A saw that reads 0 at a square cut, or one that reads 90. */
export const drawSaw = ({ pick }: Draws) => pick([0, 90] as const)

/** A flight that meets a level run, at its top or at its foot. */
export function drawLevel({ pick, step }: Draws): Knuckle {
  const pitch = step(28, 40, 1 / 2)
  return pick([
    { slopeBelow: pitch, slopeAbove: 0 },
    { slopeBelow: 0, slopeAbove: pitch },
  ])
}

/** Two flights that climb the same way, one of them steeper by enough to need a knuckle. */
export function drawFlights({ pick, step }: Draws): Knuckle {
  const easy = step(24, 36, 1 / 2)
  const steep = step(Math.max(28, easy + 4), 40, 1 / 2)
  return pick([
    { slopeBelow: steep, slopeAbove: easy },
    { slopeBelow: easy, slopeAbove: steep },
  ])
}
