import { atLeast, atMost } from './tolerance'

/** One row of the check: `ok` is null where nothing was measured. */
export interface CodeRow {
  id: string
  ok: boolean | null
  /** What was judged; the worst one where several were. */
  value: number | string | null
  limit: string
  source: string
}

/** One flight's own figures; what was not measured is null. */
export interface FlightFigures {
  pitch: number
  /** Every riser known on its own: the unit rise, and the first one where it was measured. */
  rises: number[]
  run: number | null
}

/** What the rows judge, of one stair or of a whole rail. Inches and degrees. */
export interface CodeFigures {
  heights: number[]
  flights: FlightFigures[]
  topExtension: number
  bottomExtensionHoriz: number
  outsideDia: number
  wallClearance: number
  riserSpread: number | null
}

interface Judged {
  ok: boolean | null
  value: number | string | null
  /** How far inside the limit; less than nothing fails. The least of several is the worst. */
  margin: number
}

interface RowRule {
  id: string
  limit: string
  source: string
  judge: (figures: CodeFigures) => Judged[]
}

const unmeasured: Judged = { ok: null, value: null, margin: Infinity }

const least = (value: number, limit: number): Judged => ({ ok: atLeast(value, limit), value, margin: value - limit })
const most = (value: number, limit: number): Judged => ({ ok: atMost(value, limit), value, margin: limit - value })

/** Several conditions on one thing: it fails by any, and is unmeasured when the rest pass. */
function together(value: number | string | null, conditions: Judged[]): Judged {
  const failed = conditions.some(({ ok }) => ok === false)
  const open = conditions.some(({ ok }) => ok === null)
  return { ok: failed ? false : open ? null : true, value, margin: Math.min(...conditions.map(({ margin }) => margin)) }
}

const inside = (value: number, low: number, high: number) => together(value, [least(value, low), most(value, high)])

const onlyRun = (run: number | null, low: number) => (run === null ? unmeasured : least(run, low))

/** Text of a riser and its run; a part that was not measured is left out. */
function stepText(rises: number[], run: number | null): string | null {
  const shown = [
    ...rises.map((rise) => `rise ${Number(rise.toFixed(4))}`),
    ...(run === null ? [] : [`run ${Number(run.toFixed(4))}`]),
  ]
  return shown.length > 0 ? shown.join(', ') : null
}

function step({ rises, run }: FlightFigures, judgeRise: (rise: number) => Judged, leastRun: number): Judged {
  const risers = rises.length > 0 ? rises.map(judgeRise) : [unmeasured]
  return together(stepText(rises, run), [...risers, onlyRun(run, leastRun)])
}

/** No reach at all fails whatever the run is. */
function bottomReach(reach: number, run: number | null): Judged {
  if (run !== null) return least(reach, run)
  return reach <= 0 ? { ok: false, value: reach, margin: reach } : { ...unmeasured, value: reach }
}

/** OSHA and ADA rows were read in the public text; the building codes are from memory and secondary text. */
export const codeRules: readonly RowRule[] = [
  {
    id: 'height-34-38',
    limit: '34 to 38 in',
    source: 'IBC 1014, IRC R311.7.8, ADA 505.4',
    judge: ({ heights }) => heights.map((height) => inside(height, 34, 38)),
  },
  {
    id: 'height-30-38-osha',
    limit: '30 to 38 in',
    source: '29 CFR 1910.29(f)',
    judge: ({ heights }) => heights.map((height) => inside(height, 30, 38)),
  },
  {
    id: 'top-extension-12',
    limit: '12 in or more, level',
    source: 'IBC 1014, ADA 505.10.2',
    judge: ({ topExtension }) => [least(topExtension, 12)],
  },
  {
    id: 'bottom-extension-tread',
    limit: 'one run or more, horizontally',
    source: 'IBC 1014, ADA 505.10.3',
    judge: ({ bottomExtensionHoriz, flights: [first] }) => [bottomReach(bottomExtensionHoriz, first?.run ?? null)],
  },
  {
    id: 'grip-1.25-2',
    limit: '1-1/4 to 2 in, round',
    source: 'IBC, IRC Type I, ADA 505.7.1',
    judge: ({ outsideDia }) => [inside(outsideDia, 1.25, 2)],
  },
  {
    id: 'wall-clearance-1.5',
    limit: '1-1/2 in or more',
    source: 'IBC, IRC, ADA 505.5',
    judge: ({ wallClearance }) => [least(wallClearance, 1.5)],
  },
  {
    id: 'finger-clearance-2.25-osha',
    limit: '2-1/4 in or more',
    source: '29 CFR 1910.29(f)(2)',
    judge: ({ wallClearance }) => [least(wallClearance, 2.25)],
  },
  {
    id: 'riser-tread-ibc',
    limit: 'rise 4 to 7 in, run 11 in or more',
    source: 'IBC',
    judge: ({ flights }) => flights.map((flight) => step(flight, (rise) => inside(rise, 4, 7), 11)),
  },
  {
    id: 'riser-tread-irc',
    limit: 'rise 7-3/4 in or less, run 10 in or more',
    source: 'IRC',
    judge: ({ flights }) => flights.map((flight) => step(flight, (rise) => most(rise, 7.75), 10)),
  },
  {
    id: 'stair-angle-osha',
    limit: '30° to 50°, rise 9-1/2 in or less, run 9-1/2 in or more',
    source: '29 CFR 1910.25(c)',
    judge: ({ flights }) =>
      flights.map((flight) =>
        together(`${Number(flight.pitch.toFixed(4))}°`, [
          inside(flight.pitch, 30, 50),
          step(flight, (rise) => most(rise, 9.5), 9.5),
        ]),
      ),
  },
  {
    id: 'riser-spread',
    limit: '3/8 in or less',
    source: 'IBC and IRC',
    judge: ({ riserSpread }) => [riserSpread === null ? unmeasured : most(riserSpread, 3 / 8)],
  },
]

/** Every row on the figures given: a row fails when any of its things fails, and shows the worst. */
export function judgeRows(figures: CodeFigures): CodeRow[] {
  return codeRules.map(({ id, limit, source, judge }) => {
    const judged = judge(figures)
    const { ok } = together(null, judged)
    const worst = judged.reduce((a, b) => (b.margin < a.margin ? b : a), judged[0] ?? unmeasured)
    return { id, ok, value: worst.value, limit, source }
  })
}
