/** An answer that cannot be given, as a value: which field is in the way, and what would be accepted. */
export interface Refusal {
  refused: true
  /** Path of the input, as `flights[0].rise` or `section.depth`. */
  field: string
  message: string
}

/** Refuses one field with a sentence for the person who typed it. */
export function refuse(field: string, message: string): Refusal {
  return { refused: true, field, message }
}

/** Tells a refusal from an answer, whatever the answer is. */
export function isRefusal(answer: unknown): answer is Refusal {
  return typeof answer === 'object' && answer !== null && 'refused' in answer && answer.refused === true
}

/** The first refusal of a list of checks; `null` when every check passes. */
export function firstRefusal(checks: readonly (Refusal | null)[]): Refusal | null {
  return checks.find((check) => check !== null) ?? null
}
