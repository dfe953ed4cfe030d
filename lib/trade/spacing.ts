import { hair } from './tolerance'

export interface Spacing {
  spaces: number
  spacing: number
  /** Running marks from one end. */
  marks: number[]
}

/**
 * Divides a length evenly between two end distances, no space over `maxSpacing`. Inches.
 * A length too short for both end distances gets one mark in its middle.
 */
export function spaceMarks(length: number, endDistance: number, maxSpacing: number): Spacing {
  const inner = length - 2 * endDistance
  if (inner <= hair) return { spaces: 0, spacing: 0, marks: [length / 2] }
  const spaces = Math.max(1, Math.ceil(inner / maxSpacing - hair))
  const spacing = inner / spaces
  return { spaces, spacing, marks: Array.from({ length: spaces + 1 }, (_, i) => endDistance + i * spacing) }
}
