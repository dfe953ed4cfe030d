import { z } from 'zod'

const sentence = z.string().min(3)
const value = z.union([z.number(), z.string().min(1), z.boolean()])

/** One printed value: what to give the calculator, and what stands in the print for it. */
const rowSchema = z.strictObject({
  inputs: z.record(z.string(), z.unknown()),
  /** In the unit of the set. */
  printed: value,
  /** As the print writes it, where that is not the number itself: 32° 8′, 9/64. */
  printedAs: z.string().min(1).optional(),
  /** Where this row is printed more coarsely than its set. */
  tolerance: z.number().nonnegative().optional(),
  note: sentence.optional(),
  /** Why the print is taken to be wrong: then it must disagree. */
  printIsWrong: sentence.optional(),
})

/** Printed values of one quantity from one source. */
const setSchema = z.strictObject({
  quantity: sentence,
  /** Name of the calculator's output; inside lists and groups a path such as `parts.A.topEdge`. */
  output: z.string().min(1),
  unit: z.enum(['in', 'deg', 'sticks', 'yes or no']),
  /** What the print's own rounding allows. */
  tolerance: z.number().nonnegative(),
  source: sentence,
  where: sentence,
  provenance: sentence,
  /** A value looked up in the very table that the calculator copies proves the copying only. */
  kind: z.enum(['computed', 'looked-up']),
  origin: z.enum(['published', 'from memory']),
  note: sentence.optional(),
  rows: z.array(rowSchema).min(1),
})

/** A file of `content/proof`: published values only, never one of our own working. */
export const proofFileSchema = z.strictObject({ sets: z.array(setSchema).min(1) })

type ProofSet = z.infer<typeof setSchema>

/** One printed value with all that is said of its set. */
export type ProofRow = Omit<ProofSet, 'rows'> & z.infer<typeof rowSchema>

/** The rows of a proof file, each by itself. @throws ZodError when the file lacks a source or says something unknown. */
export function rowsOf(file: unknown): ProofRow[] {
  return proofFileSchema.parse(file).sets.flatMap(({ rows, ...set }) => rows.map((row) => ({ ...set, ...row })))
}
