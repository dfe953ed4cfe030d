import { describe, expect, it } from 'vitest'
import type { HandrailInputs } from '@/lib/trade/rail/types'
import { plainRail, refused } from '@/tests/support/plain-rail'

const flight = { risers: 11, rise: 6, run: 8 }
const taped = { nosingRise: 60, nosingRun: 80 }
const level = { type: 'level' as const, length: 12 }
const weld = { areaIn2: 0.02, efficiency: 0.93, lbPerHour: 3, arcOnPct: 25 }

const cases: [string, string, Partial<HandrailInputs>][] = [
  ['a depth of nothing', 'section.depth', { section: { shape: 'square', depth: 0, width: 1.5 } }],
  ['a width below nothing', 'section.width', { section: { shape: 'square', depth: 1.5, width: -1 } }],
  ['a height of nothing', 'railHeight', { railHeight: 0 }],
  ['a height that is no number', 'railHeight', { railHeight: NaN }],
  ['no flight', 'flights', { flights: [] }],
  ['one riser', 'flights[0].risers', { flights: [{ ...flight, risers: 1 }] }],
  ['a riser of nothing', 'flights[0].rise', { flights: [{ ...flight, rise: 0 }] }],
  ['a tread of nothing', 'flights[0].run', { flights: [{ ...flight, run: 0 }] }],
  ['a rake of nothing', 'flights[0].rake', { flights: [{ rake: 0, pitch: 35 }] }],
  ['a plumb pitch', 'flights[0].pitch', { flights: [{ rake: 80, pitch: 90 }] }],
  ['a level pitch', 'flights[0].pitch', { flights: [{ rake: 80, pitch: 0 }] }],
  ['a taped rise of nothing', 'flights[0].nosingRise', { flights: [{ nosingRise: 0, nosingRun: 80 }] }],
  ['a taped run of nothing', 'flights[0].nosingRun', { flights: [{ nosingRise: 60, nosingRun: 0 }] }],
  ['a taped rake of nothing', 'flights[0].nosingRake', { flights: [{ ...taped, nosingRake: 0 }] }],
  ['a first rise below nothing', 'flights[0].firstRise', { flights: [{ ...taped, firstRise: -1 }] }],
  ['a level bottom without its first rise', 'flights[0].firstRise', { flights: [taped], bottom: level }],
  [
    'a landing without the first rise above it',
    'flights[1].firstRise',
    { flights: [flight, taped], landings: [{ length: 48 }] },
  ],
  ['fewer landings than flights less one', 'landings', { flights: [flight, flight] }],
  ['more landings than flights less one', 'landings', { landings: [{ length: 48 }] }],
  ['a landing of no length', 'landings[0].length', { flights: [flight, flight], landings: [{ length: 0 }] }],
  [
    'a landing height of nothing',
    'landings[0].railHeight',
    { flights: [flight, flight], landings: [{ length: 48, railHeight: 0 }] },
  ],
  [
    'a landing too short for the treads above it',
    'landings[0].length',
    { flights: [flight, flight], landings: [{ length: 9 }] },
  ],
  ['a sloped end without its horizontal', 'bottom.horizontal', { bottom: { type: 'slope' } }],
  ['a level bottom without its length', 'bottom.length', { bottom: { type: 'level' } }],
  ['a level top without its length', 'top.length', { top: { type: 'level', length: null } }],
  ['a level top under 2 in', 'top.length', { top: { type: 'level', length: 1.9 } }],
  ['a level top whose underside is under 2 in', 'top.length', { top: { type: 'level', length: 2.4 } }],
  ['a bottom height of nothing', 'bottom.railHeight', { bottom: { ...level, railHeight: 0 } }],
  ['a knuckle on the wrong side', 'top.length', { top: { ...level, railHeight: 47 } }],
  [
    'a rake that its heights leave nothing of',
    'flights[0].risers',
    { flights: [{ risers: 2, rise: 6, run: 8 }], top: { ...level, railHeight: 29 } },
  ],
  ['a top run parallel to the rake beside it', 'top.length', { top: { ...level, slopeInPerFt: 9, railHeight: 38 } }],
  ['a volute that eats its part', 'volutes.top', { top: level, volutes: { top: 10.5 } }],
  ['a volute below nothing', 'volutes.bottom', { volutes: { bottom: -1 } }],
  [
    'a volute and a return on one end',
    'volutes.top',
    { top: { ...level, return: { clearance: 1.5 } }, volutes: { top: 5 } },
  ],
  ['a return without clearance', 'bottom.return.clearance', { bottom: { type: 'none', return: { clearance: 0 } } }],
  ['a gap wider than the clearance', 'top.return.gap', { top: { ...level, return: { clearance: 1.5, gap: 2 } } }],
  ['an end distance below nothing', 'brackets.endDistance', { brackets: { endDistance: -1, maxSpacing: 48 } }],
  ['a spacing of nothing', 'brackets.maxSpacing', { brackets: { endDistance: 6, maxSpacing: 0 } }],
  ['a bracket nowhere', 'brackets.field[1]', { brackets: { field: [10, NaN] } }],
  ['a joint clear below nothing', 'brackets.jointClear', { brackets: { field: [10], jointClear: -1 } }],
  ['a stick of no length', 'stock.length', { stock: { length: 0, kerf: 0.0625 } }],
  ['a kerf below nothing', 'stock.kerf', { stock: { length: 240, kerf: -1 } }],
  ['a trim that leaves no stick', 'stock.trim', { stock: { length: 240, kerf: 0.0625, trim: 240 } }],
  ['an efficiency over one', 'weld.efficiency', { weld: { ...weld, efficiency: 1.1 } }],
  ['a bead below nothing', 'weld.areaIn2', { weld: { ...weld, areaIn2: -1 } }],
  ['a diameter of nothing', 'code.outsideDia', { code: { outsideDia: 0, wallClearance: 1.5 } }],
  ['a wall clearance below nothing', 'code.wallClearance', { code: { outsideDia: 1.5, wallClearance: -1 } }],
]

describe('the whole rail refuses', () => {
  it.each(cases)('%s, naming %s', (_, field, change) => {
    expect(refused(change).field).toBe(field)
  })

  it('speaks in whole sentences', () => {
    for (const [, , change] of cases) expect(refused({ ...plainRail, ...change }).message).toMatch(/^[A-Z].*\.$/)
  })
})
