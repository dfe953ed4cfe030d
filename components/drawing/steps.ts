import type { Spot } from '@/lib/drawing/sketch'
import { spot } from '@/lib/drawing/strokes'

/** A stair profile of so many risers, from the foot of the first riser below this nosing. Inches. */
export function steps(nosing: { x: number; y: number }, risers: number, rise: number, run: number): Spot[] {
  const points = [spot(nosing.x, nosing.y - rise)]
  for (let i = 0; i < risers; i++) {
    points.push(spot(nosing.x + i * run, nosing.y + i * rise), spot(nosing.x + (i + 1) * run, nosing.y + i * rise))
  }
  return points
}
