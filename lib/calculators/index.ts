import type { AnyCalculator } from './define'
import { calculatorIds, loadCalculator } from './load'

/** Every entry, in the order of the handbook. For the server: a page loads its own only. */
export const allCalculators = (): Promise<AnyCalculator[]> => Promise.all(calculatorIds.map(loadCalculator))
