import type { Fault } from '@/lib/calculators/read'

/** Faults in words that stand by themselves beside a box: each named once, a place in a list by its number. */
export function placedFaults(faults: readonly Fault[]): Fault[] {
  return faults.map(({ field, message }) => {
    const [, index] = /^brackets\.field\[(\d+)\]$/.exec(field) ?? []
    return index === undefined ? { field, message } : { field, message: `Number ${Number(index) + 1}. ${message}` }
  })
}
