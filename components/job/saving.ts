/** What is to be kept as a cut sheet. */
export interface Saving {
  calculator: string
  /** As typed or as numbers: the server reads and computes them again. */
  inputs: Record<string, unknown>
}
