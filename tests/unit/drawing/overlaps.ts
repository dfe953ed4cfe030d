import type { Box, Point } from '@/lib/drawing/boxes'
import type { Mark, Plate, PlacedLabel } from '@/lib/drawing/plate'

/**
 * Every label that lies on another label or on a line, found by walking along them in small steps.
 * On purpose another way than the one that placed them: no separating axes, no clipping.
 */
export function overlaps(plate: Plate): string[] {
  const lines = plate.marks.filter((mark) => !mark.passable)
  return plate.labels.flatMap((label, i) => [
    ...lines.filter((mark) => isOnLine(label, mark)).map((mark) => `${said(label)} on a ${mark.ink} line`),
    ...plate.labels
      .slice(i + 1)
      .filter((other) => isOnLabel(label.box, other.box))
      .map((other) => `${said(label)} on ${said(other)}`),
  ])
}

/** Labels and lines that leave the paper. */
export function offPaper({ width, height, marks, labels }: Plate): string[] {
  const isOff = ({ x, y }: Point) => x < 0 || y < 0 || x > width || y > height
  return [
    ...labels.filter(({ box }) => corners(box).some(isOff)).map(said),
    ...marks.filter(({ points }) => points.some(isOff)).map(({ ink }) => `a ${ink} line`),
  ]
}

/** The words of a label, run after run. */
export function said({ runs }: Pick<PlacedLabel, 'runs'>): string {
  return runs.map((run) => (run.kind === 'text' ? run.text : '')).join('')
}

function corners({ x, y, halfWidth: w, halfHeight: h, cos, sin }: Box): Point[] {
  return [
    [-w, -h],
    [w, -h],
    [w, h],
    [-w, h],
  ].map(([a = 0, b = 0]) => ({ x: x + a * cos - b * sin, y: y + a * sin + b * cos }))
}

/** How far a point lies outside a box; 0 inside. */
function distance(box: Box, point: Point): number {
  const along = Math.abs((point.x - box.x) * box.cos + (point.y - box.y) * box.sin) - box.halfWidth
  const across = Math.abs((point.y - box.y) * box.cos - (point.x - box.x) * box.sin) - box.halfHeight
  return Math.hypot(Math.max(0, along), Math.max(0, across))
}

function isOnLine({ box }: PlacedLabel, { points, closed, width }: Mark): boolean {
  const ends = closed ? [...points, ...points.slice(0, 1)] : points
  return ends.some((b, i) => {
    const a = ends[i - 1]
    if (!a) return false
    const steps = Math.max(1, Math.ceil(Math.hypot(b.x - a.x, b.y - a.y)))
    for (let k = 0; k <= steps; k++) {
      const point = { x: a.x + ((b.x - a.x) * k) / steps, y: a.y + ((b.y - a.y) * k) / steps }
      if (distance(box, point) < width / 2) return true
    }
    return false
  })
}

function isOnLabel(a: Box, b: Box): boolean {
  const reach = (box: Box) => Math.hypot(box.halfWidth, box.halfHeight)
  if (Math.hypot(a.x - b.x, a.y - b.y) > reach(a) + reach(b)) return false
  for (let u = -1; u <= 1; u += 0.05) {
    for (let v = -1; v <= 1; v += 0.1) {
      const [x, y] = [u * a.halfWidth, v * a.halfHeight]
      if (distance(b, { x: a.x + x * a.cos - y * a.sin, y: a.y + x * a.sin + y * a.cos }) === 0) return true
    }
  }
  return false
}
