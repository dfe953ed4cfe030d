import type { Point } from './boxes'
import type { PlacedRun } from './plate'

/** Outline of a shape set among words, px from the label's start, y down: fonts lack arrows and triangles. */
export function shapeOutline({ shape, x, y, size, width }: Extract<PlacedRun, { kind: 'shape' }>): Point[] {
  const top = y - size * 0.66
  if (shape === 'triangle-down')
    return [
      { x: x + width * 0.08, y: top },
      { x: x + width * 0.92, y: top },
      { x: x + width / 2, y },
    ]
  if (shape === 'triangle-up')
    return [
      { x: x + width * 0.08, y },
      { x: x + width * 0.92, y },
      { x: x + width / 2, y: top },
    ]
  const middle = y - size * 0.33
  const shaft = size * 0.05
  const head = size * 0.22
  const neck = x + width - size * 0.42
  const right = [
    { x: x + size * 0.12, y: middle - shaft },
    { x: neck, y: middle - shaft },
    { x: neck, y: middle - head },
    { x: x + width, y: middle },
    { x: neck, y: middle + head },
    { x: neck, y: middle + shaft },
    { x: x + size * 0.12, y: middle + shaft },
  ]
  // Pointing left, the same outline turned about its own middle.
  return shape === 'arrow' ? right : right.map((p) => ({ x: 2 * x + width - p.x, y: p.y }))
}
