import { expect } from 'vitest'
import published from './examples.json'

/** One worked example of the contract; what it expects may be part of the answer only. */
export interface Example {
  id: string
  calculator: string
  inputs: Record<string, unknown>
  expected: Record<string, unknown>
  tolerance: { abs: number }
}

/** Where a printed value is coarser than its tolerance: 100 * 337.5 / 480 is 70.3125, printed as 70.31. */
const corrections: Record<string, Record<string, unknown>> = { 'cut-list-1': { yieldPct: 70.3125 } }

/** The worked examples of one calculator. Throws when there is none: a test over nothing proves nothing. */
export function examplesOf(calculator: string): Example[] {
  const found = (published.examples as Example[]).filter((example) => example.calculator === calculator)
  if (found.length === 0) throw new Error(`No worked example of ${calculator}`)
  return found.map((example) => ({ ...example, expected: { ...example.expected, ...corrections[example.id] } }))
}

const isRecord = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null

/**
 * Expects every value of `expected` in `actual`: numbers within `tolerance`, lists of equal length, all else alike.
 * Further values of `actual` are welcome.
 */
export function expectWithin(actual: unknown, expected: unknown, tolerance: number, path = 'answer'): void {
  if (typeof expected === 'number') {
    expect(actual, path).toBeTypeOf('number')
    expect(Math.abs(Number(actual) - expected), `${path}: ${actual} for ${expected}`).toBeLessThanOrEqual(tolerance)
    return
  }
  if (!isRecord(expected)) {
    expect(actual, path).toBe(expected)
    return
  }
  if (Array.isArray(expected)) expect(actual, path).toHaveLength(expected.length)
  for (const [key, value] of Object.entries(expected)) {
    expectWithin(isRecord(actual) ? actual[key] : undefined, value, tolerance, `${path}.${key}`)
  }
}
