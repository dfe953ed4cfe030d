import { describe, expect, it } from 'vitest'
import type { HandrailInputs } from '@/lib/trade/rail/types'
import { solved } from '@/tests/support/plain-rail'

const code = { outsideDia: 1.5, wallClearance: 2.25 }
const rows = (change: Partial<HandrailInputs>) => {
  const { checks } = solved({ code, ...change })
  return (id: string) => checks?.find((row) => row.id === id)
}
const flight = { risers: 11, rise: 6, run: 8 }
const good = { risers: 11, rise: 7, run: 11 }
const near = (value: number) => expect.closeTo(value, 9)

describe('code rows of a whole rail', () => {
  it('judge every flight and show the worst', () => {
    const row = rows({
      flights: [good, { risers: 11, rise: 7.5, run: 11 }, { risers: 11, rise: 7.25, run: 11 }],
      landings: [{ length: 60 }, { length: 60 }],
    })
    expect(row('riser-tread-ibc')).toMatchObject({ ok: false, value: 'rise 7.5, run 11' })
    expect(row('riser-tread-irc')).toMatchObject({ ok: true })
    expect(row('riser-spread')).toMatchObject({ ok: null, value: null })
  })

  it('judge every height that was given', () => {
    const row = rows({
      flights: [good, good],
      landings: [{ length: 60, railHeight: 33 }],
      top: { type: 'level', length: 12, railHeight: 38 },
    })
    expect(row('height-34-38')).toMatchObject({ ok: false, value: 33 })
    expect(row('height-30-38-osha')).toMatchObject({ ok: true, value: 38 })
  })

  it('take the shorter of the level length and the level part past its knuckle', () => {
    const topped = (railHeight: number) => rows({ top: { type: 'level', length: 12, railHeight } })('top-extension-12')
    expect(topped(36)).toMatchObject({ ok: true, value: near(12) })
    expect(topped(37.5)).toMatchObject({ ok: false, value: near(10) })
    expect(topped(34.5)).toMatchObject({ ok: true, value: near(12) })
    expect(rows({})('top-extension-12')).toMatchObject({ ok: false, value: 0 })
  })

  it('take the bottom reach to the outer end of a sloped end, or to the knuckle of a level one', () => {
    expect(rows({ bottom: { type: 'slope', horizontal: 8 } })('bottom-extension-tread')).toMatchObject({
      ok: true,
      value: near(8),
    })
    expect(rows({ bottom: { type: 'slope', horizontal: 7.9 } })('bottom-extension-tread')).toMatchObject({ ok: false })
    expect(rows({ bottom: { type: 'level', length: 20 } })('bottom-extension-tread')).toMatchObject({
      ok: true,
      value: near(8),
    })
    expect(rows({ bottom: { type: 'level', length: 20, railHeight: 36.75 } })('bottom-extension-tread')).toMatchObject({
      ok: false,
      value: near(7),
    })
    expect(rows({})('bottom-extension-tread')).toMatchObject({ ok: false, value: 0 })
  })

  it('leave open what a taped flight does not say, and fail what it does', () => {
    const taped = rows({ flights: [{ nosingRise: 60, nosingRun: 80 }], bottom: { type: 'slope', horizontal: 8 } })
    for (const id of ['riser-tread-ibc', 'riser-tread-irc', 'stair-angle-osha', 'bottom-extension-tread'])
      expect(taped(id)).toMatchObject({ ok: null })
    expect(rows({ flights: [{ rake: 100, pitch: 25 }] })('stair-angle-osha')).toMatchObject({ ok: false })
    expect(rows({ flights: [{ nosingRise: 60, nosingRun: 80, run: 12 }] })('riser-tread-ibc')).toMatchObject({
      ok: false,
      value: 'rise 9, run 12',
    })
    expect(
      rows({ flights: [{ nosingRise: 60, nosingRun: 96, run: 11.2, firstRise: 7.9 }] })('riser-tread-irc'),
    ).toMatchObject({ ok: false })
  })
})

describe('closing check of taped flights', () => {
  it('speaks of the flights that were taped, counted from the bottom', () => {
    const { closing, warnings } = solved({
      flights: [
        flight,
        { nosingRise: 60, nosingRun: 80, nosingRake: 99.9, firstRise: 6 },
        { nosingRise: 60, nosingRun: 80, nosingRake: 100.25, firstRise: 6 },
      ],
      landings: [{ length: 48 }, { length: 48 }],
    })
    expect(closing).toEqual([
      { flight: 2, error: near(0.1), verdict: 'agree' },
      { flight: 3, error: near(-0.25), verdict: 'measure again' },
    ])
    expect(warnings).toMatchObject([{ field: 'flights[2].nosingRake' }])
  })
})

describe('sticks of a whole rail', () => {
  const stock = { length: 120, kerf: 0.0625, trim: 0.5 }

  it('say which part bears which length, and nest the mitered ones', () => {
    const rail = solved({
      stock,
      bottom: { type: 'slope', horizontal: 8 },
      top: { type: 'level', length: 12, return: { clearance: 1.5 } },
    })
    expect(rail.stock).toMatchObject({ sticks: 2, bound: 2, proved: true, marks: [['A', 'top return'], ['B']] })
    expect(rail.stock?.nested.map(({ pieces }) => pieces.length)).toEqual([2, 1])
  })

  it('are none, with a warning naming the part, where one is longer than the stick', () => {
    const { stock: sticks, warnings } = solved({ stock: { ...stock, length: 96 } })
    expect(sticks).toBeNull()
    expect(warnings).toMatchObject([
      { field: 'stock.length', message: expect.stringMatching(/^Part A is longer than the stick: splice/) },
    ])
  })

  it('share the parallel cuts of two level ends with the rake between them', () => {
    const rail = solved({
      stock: { ...stock, length: 240 },
      bottom: { type: 'level', length: 12 },
      top: { type: 'level', length: 12 },
    })
    const setback = rail.joints[0]?.setback ?? NaN
    // Three pieces with four mitered ends of one setback: two cuts shared.
    expect(rail.stock?.nested[0]?.saved).toBeCloseTo(2 * setback, 1)
  })
})

describe('warnings of a whole rail', () => {
  it('name a short part, an unusual height and a section that is not round', () => {
    const { warnings } = solved({
      railHeight: 33,
      section: { shape: 'round', depth: 1.5, width: 1.66 },
      top: { type: 'level', length: 5.9 },
    })
    expect(warnings.map(({ field }) => field)).toEqual(['section.width', 'railHeight', undefined])
    expect(warnings[2]?.message).toMatch(/^Part B \(top level\) is only 5\.\d+ in/)
  })
})
