import type { Drawing } from '@/lib/drawing/sketch'

/** Drops the names that only the drawing's own file knows, so that one loader serves them all. */
function asDrawing<Given, Solved>({ draw }: { draw: Drawing<Given, Solved> }): Drawing {
  return draw as unknown as Drawing
}

/** One line a drawing, named as its calculator. */
const drawings = {
  miter: () => import('./miter').then(asDrawing),
} satisfies Record<string, () => Promise<Drawing>>

export const drawingIds = Object.keys(drawings) as (keyof typeof drawings)[]

const loaded = new Map<string, Promise<Drawing>>()

/** The drawing of a calculator, or null where it has none; the same promise each time, so that it may be awaited in a render. */
export function loadDrawing(id: string): Promise<Drawing> | null {
  const known = drawingIds.find((each) => each === id)
  if (!known) return null
  const promise = loaded.get(known) ?? drawings[known]()
  loaded.set(known, promise)
  return promise
}
