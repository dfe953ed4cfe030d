import type { Unit } from '@/lib/calculators/fields'

/** What stands at the right end of a box. */
export const unitWords: Readonly<Partial<Record<Unit, string>>> = {
  deg: 'degrees',
  in: 'in',
  'in/ft': 'in per ft',
  'in/12': 'in in 12',
  mm: 'mm',
  in2: 'sq in',
  lb: 'lb',
  'lb/h': 'lb an hour',
  min: 'min',
  '%': '%',
}
