import { cosDeg, sinDeg, tanDeg } from '../angles'
import { hair } from '../tolerance'
import type { Point } from './types'

/** A straight line in elevation through a point. Slope in degrees, up positive. */
export interface Line extends Point {
  slope: number
}

export const heightAt = (line: Line, x: number) => line.y + (x - line.x) * tanDeg(line.slope)

export const pointOn = (line: Line, x: number): Point => ({ x, y: heightAt(line, x) })

/**
 * Where the lower line meets the upper one. Lines that run on in one another meet at `joinX`;
 * `null` when they run side by side.
 */
export function meet(lower: Line, upper: Line, joinX: number): Point | null {
  const steeper = tanDeg(lower.slope) - tanDeg(upper.slope)
  if (Math.abs(lower.slope - upper.slope) >= hair) {
    const apart = heightAt(upper, lower.x) - lower.y
    return pointOn(lower, lower.x + apart / steeper)
  }
  return Math.abs(heightAt(upper, lower.x) - lower.y) < 1e-6 ? pointOn(lower, joinX) : null
}

/** A point moved along a slope and then square off it, downwards. */
export function offset(from: Point, slope: number, along: number, down: number): Point {
  return {
    x: from.x + along * cosDeg(slope) + down * sinDeg(slope),
    y: from.y + along * sinDeg(slope) - down * cosDeg(slope),
  }
}
