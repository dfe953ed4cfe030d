export interface Point {
  x: number
  y: number
}

/** A rectangle turned about its centre: half sizes, and the cosine and sine of its turn (y down). */
export interface Box {
  x: number
  y: number
  halfWidth: number
  halfHeight: number
  cos: number
  sin: number
}

export interface Extent {
  left: number
  top: number
  right: number
  bottom: number
}

export const noExtent: Extent = { left: Infinity, top: Infinity, right: -Infinity, bottom: -Infinity }

/** The level rectangle round both. */
export function union(a: Extent, b: Extent): Extent {
  return {
    left: Math.min(a.left, b.left),
    top: Math.min(a.top, b.top),
    right: Math.max(a.right, b.right),
    bottom: Math.max(a.bottom, b.bottom),
  }
}

/** The level rectangle round a turned box. */
export function extentOfBox(box: Box): Extent {
  const across = Math.abs(box.cos) * box.halfWidth + Math.abs(box.sin) * box.halfHeight
  const down = Math.abs(box.sin) * box.halfWidth + Math.abs(box.cos) * box.halfHeight
  return { left: box.x - across, top: box.y - down, right: box.x + across, bottom: box.y + down }
}

/** True when the two come within `air` of each other: separating axes, the two directions of each box. */
export function boxesTouch(a: Box, b: Box, air = 0): boolean {
  return !apartAlong(a, b, air) && !apartAlong(b, a, air)
}

function apartAlong(a: Box, b: Box, air: number): boolean {
  const dx = b.x - a.x
  const dy = b.y - a.y
  const cos = Math.abs(a.cos * b.cos + a.sin * b.sin)
  const sin = Math.abs(a.cos * b.sin - a.sin * b.cos)
  const along = Math.abs(dx * a.cos + dy * a.sin)
  const across = Math.abs(dy * a.cos - dx * a.sin)
  return (
    along > air + a.halfWidth + b.halfWidth * cos + b.halfHeight * sin ||
    across > air + a.halfHeight + b.halfWidth * sin + b.halfHeight * cos
  )
}

/** True when a line of that half width comes into the box: the line is clipped in the box's own frame. */
export function segmentTouches(box: Box, a: Point, b: Point, half: number): boolean {
  const ax = (a.x - box.x) * box.cos + (a.y - box.y) * box.sin
  const ay = (a.y - box.y) * box.cos - (a.x - box.x) * box.sin
  const dx = (b.x - a.x) * box.cos + (b.y - a.y) * box.sin
  const dy = (b.y - a.y) * box.cos - (b.x - a.x) * box.sin
  const width = box.halfWidth + half
  const height = box.halfHeight + half
  if (Math.abs(dx) < 1e-9 && Math.abs(ax) > width) return false
  if (Math.abs(dy) < 1e-9 && Math.abs(ay) > height) return false
  // Shares of the line at which it enters and leaves each pair of sides.
  const alongX = dx === 0 ? Infinity : width / Math.abs(dx)
  const alongY = dy === 0 ? Infinity : height / Math.abs(dy)
  const middleX = dx === 0 ? 0 : -ax / dx
  const middleY = dy === 0 ? 0 : -ay / dy
  const entering = Math.max(0, middleX - alongX, middleY - alongY)
  return entering <= Math.min(1, middleX + alongX, middleY + alongY)
}

/** True when two lines cross or touch. */
export function segmentsCross(a: Point, b: Point, c: Point, d: Point): boolean {
  const side = (p: Point, q: Point, r: Point) => (q.x - p.x) * (r.y - p.y) - (q.y - p.y) * (r.x - p.x)
  return side(a, b, c) * side(a, b, d) < 0 && side(c, d, a) * side(c, d, b) < 0
}
