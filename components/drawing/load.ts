import type { Drawing } from '@/lib/drawing/sketch'

/** Drops the names that only the drawing's own file knows, so that one loader serves them all. */
function asDrawing<Given, Solved>({ draw }: { draw: Drawing<Given, Solved> }): Drawing {
  return draw as unknown as Drawing
}

/** One line a drawing, named as its calculator. */
const drawings = {
  'cut-list': () => import('./cut-list').then(asDrawing),
  'field-check': () => import('./field-check').then(asDrawing),
  handrail: () => import('./handrail').then(asDrawing),
  'knuckle-height': () => import('./knuckle-height').then(asDrawing),
  'long-short-point': () => import('./long-short-point').then(asDrawing),
  miter: () => import('./miter').then(asDrawing),
  'nosing-line': () => import('./nosing-line').then(asDrawing),
  pitch: () => import('./pitch').then(asDrawing),
  'saw-dial': () => import('./saw-dial').then(asDrawing),
  'tape-math': () => import('./tape-math').then(asDrawing),
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
