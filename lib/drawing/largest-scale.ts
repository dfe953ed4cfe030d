import type { Spot, Stroke } from './sketch'

export interface Room {
  width: number
  height: number
}

/** The largest scale at which the bare strokes fit, by halving; 0 when their paper-sized pieces alone do not. */
export function largestScale(strokes: readonly Stroke[], room: Room, textScale: number): number {
  const spots = strokes.flatMap(spotsOf)
  const fits = (scale: number) => {
    const span = (at: (spot: Spot) => number) => {
      let low = Infinity
      let high = -Infinity
      for (const spot of spots) {
        const value = at(spot)
        if (value < low) low = value
        if (value > high) high = value
      }
      return high - low
    }
    return (
      span((s) => s.x * scale + (s.dx ?? 0) * textScale) <= room.width - 4 &&
      span((s) => s.y * scale + (s.dy ?? 0) * textScale) <= room.height - 4
    )
  }
  let low = 0
  let high = 1
  while (fits(high) && high < 1e6) high *= 2
  if (!fits(1e-9)) return 0
  for (let i = 0; i < 30; i++) {
    const middle = (low + high) / 2
    if (fits(middle)) low = middle
    else high = middle
  }
  return low
}

function spotsOf(stroke: Stroke): readonly Spot[] {
  if (stroke.kind === 'path') return stroke.points
  const { centre, radius } = stroke
  const size = 'inches' in radius ? { r: radius.inches, p: 0 } : { r: 0, p: radius.paper }
  const turns = Array.from(
    { length: 9 },
    (_, i) => ((stroke.from + ((stroke.to - stroke.from) * i) / 8) * Math.PI) / 180,
  )
  return turns.map((t) => ({
    x: centre.x + size.r * Math.cos(t),
    y: centre.y + size.r * Math.sin(t),
    dx: (centre.dx ?? 0) + size.p * Math.cos(t),
    dy: (centre.dy ?? 0) + size.p * Math.sin(t),
  }))
}
