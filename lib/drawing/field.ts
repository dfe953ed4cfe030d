import {
  boxesTouch,
  extentOfBox,
  noExtent,
  segmentsCross,
  segmentTouches,
  union,
  type Box,
  type Extent,
  type Point,
} from './boxes'
import type { Mark } from './plate'
import type { Ink } from './sketch'

interface Segment extends Extent {
  a: Point
  b: Point
  half: number
  ink: Ink
}

/** Paper that is being filled: what lies on it already, and whether a further label or line finds room. Px, y down. */
export class Field {
  private readonly segments: Segment[] = []
  private readonly boxes: { box: Box; extent: Extent }[] = []
  extent: Extent = noExtent

  constructor(
    private readonly width: number,
    private readonly height: number,
  ) {}

  addMark(mark: Mark): void {
    const half = mark.width / 2
    const last = mark.closed ? mark.points.length : mark.points.length - 1
    for (let i = 0; i < last; i++) {
      const a = mark.points[i]
      const b = mark.points[(i + 1) % mark.points.length]
      if (!a || !b) continue
      const segment = {
        a,
        b,
        half,
        ink: mark.ink,
        left: Math.min(a.x, b.x) - half,
        right: Math.max(a.x, b.x) + half,
        top: Math.min(a.y, b.y) - half,
        bottom: Math.max(a.y, b.y) + half,
      }
      if (!mark.passable) this.segments.push(segment)
      this.extent = union(this.extent, segment)
    }
  }

  addBox(box: Box): void {
    const extent = extentOfBox(box)
    this.boxes.push({ box, extent })
    this.extent = union(this.extent, extent)
  }

  /** True while everything drawn, and this besides, still goes on the paper. */
  holds(more: Extent = noExtent): boolean {
    const all = union(this.extent, more)
    return all.right - all.left <= this.width && all.bottom - all.top <= this.height
  }

  /** True when a label may lie here: on the paper, off every line and label by the clearance. */
  isFree(box: Box, clearance: number): boolean {
    const across = Math.abs(box.cos) * box.halfWidth + Math.abs(box.sin) * box.halfHeight
    const down = Math.abs(box.sin) * box.halfWidth + Math.abs(box.cos) * box.halfHeight
    if (!this.holdsBox(box, across, down)) return false
    const left = box.x - across - clearance
    const right = box.x + across + clearance
    const top = box.y - down - clearance
    const bottom = box.y + down + clearance
    for (const { box: other, extent: e } of this.boxes) {
      if (left <= e.right && e.left <= right && top <= e.bottom && e.top <= bottom && boxesTouch(box, other, clearance))
        return false
    }
    for (const s of this.segments) {
      if (left > s.right || s.left > right || top > s.bottom || s.top > bottom) continue
      if (segmentTouches(box, s.a, s.b, s.half + clearance)) return false
    }
    return true
  }

  private holdsBox({ x, y }: Box, across: number, down: number): boolean {
    const { left, right, top, bottom } = this.extent
    return (
      Math.max(right, x + across) - Math.min(left, x - across) <= this.width &&
      Math.max(bottom, y + down) - Math.min(top, y - down) <= this.height
    )
  }

  /** True when a line may be drawn here without running into a label. */
  isClear(a: Point, b: Point, clearance: number): boolean {
    return !this.boxes.some(({ box }) => segmentTouches(box, a, b, clearance))
  }

  /** How many lines of these inks a line would cross. */
  crossings(a: Point, b: Point, inks: ReadonlySet<Ink>): number {
    return this.segments.filter((s) => inks.has(s.ink) && segmentsCross(a, b, s.a, s.b)).length
  }
}
