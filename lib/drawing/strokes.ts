import type { ArcStroke, Fill, Ink, PathStroke, Spot } from './sketch'

type Extra = Pick<PathStroke, 'part' | 'passable'>

/** A point in inches, moved by px on paper. */
export const spot = (x: number, y: number, dx = 0, dy = 0): Spot => ({ x, y, dx, dy })

/** A spot so far away in a direction: inches, degrees from level. */
export function toward(from: Spot, degrees: number, inches: number): Spot {
  const turn = (degrees * Math.PI) / 180
  return { ...from, x: from.x + inches * Math.cos(turn), y: from.y + inches * Math.sin(turn) }
}

/** A spot moved on paper: px, degrees from level. */
export function nudged(from: Spot, degrees: number, px: number): Spot {
  const turn = (degrees * Math.PI) / 180
  return { ...from, dx: (from.dx ?? 0) + px * Math.cos(turn), dy: (from.dy ?? 0) + px * Math.sin(turn) }
}

/** A line through these spots. */
export const path = (ink: Ink, points: readonly Spot[], extra?: Extra): PathStroke => ({
  kind: 'path',
  ink,
  points,
  ...extra,
})

/** A closed outline, filled or open. */
export const outline = (ink: Ink, points: readonly Spot[], fill?: Fill, extra?: Extra): PathStroke => ({
  kind: 'path',
  ink,
  points,
  closed: true,
  fill,
  ...extra,
})

/** An arc of a radius on paper, px; degrees from level, counterclockwise. */
export const angleArc = (centre: Spot, paper: number, from: number, to: number, ink: Ink = 'dim'): ArcStroke => ({
  kind: 'arc',
  centre,
  radius: { paper },
  from,
  to,
  ink,
})

/** The filled triangle at a long point: its tip on the corner, its back toward `way` degrees. */
export function longPoint(tip: Spot, way: number, part?: string, size = 12): PathStroke {
  return outline('flag', [tip, nudged(tip, way + 27, size), nudged(tip, way - 27, size)], 'solid', { part })
}

/** The points of a torn edge from one face of a bar to the other: the bar goes on beyond the drawing. */
export function tornEdge(a: Spot, b: Spot): Spot[] {
  const along = (share: number, off: number): Spot => {
    const dx = b.x - a.x
    const dy = b.y - a.y
    return { x: a.x + dx * share - dy * off, y: a.y + dy * share + dx * off, dx: a.dx, dy: a.dy }
  }
  return [a, along(0.4, 0), along(0.45, 0.2), along(0.55, -0.2), along(0.6, 0), b]
}
