import { describe, expect, it } from 'vitest'
import { measureQuery, readMeasure, writeMeasure } from '@/components/calculator/handrail/measure-address'
import { addFlight, mirrorHand, removeFlight } from '@/components/calculator/handrail/measure-edits'
import { inputsOf, measureFromInputs } from '@/components/calculator/handrail/measure-inputs'
import { blankMeasure, textAt, withText, type Measure } from '@/components/calculator/handrail/measure'
import { answer } from '@/lib/calculators/answer'
import { asAny } from '@/lib/calculators/define'
import { handrail } from '@/lib/calculators/field/handrail'
import { defaultPrecision } from '@/lib/calculators/fields'

const example = measureFromInputs(handrail.example)
const solve = (raw: unknown) => answer(asAny(handrail), raw, defaultPrecision)

const everything: Measure = {
  ...example,
  hand: 'R',
  flights: [
    { way: 'count', risers: '7', rise: '7 1/4', run: '10.5' },
    { way: 'rake', rake: "6' 2 1/2", pitch: '33.7', firstRise: '7', run: '11' },
    { way: 'tape', nosingRise: '35', nosingRun: '55', nosingRake: '65 3/16', firstRise: '7' },
  ],
  landings: [
    { length: '48', slopeInPerFt: '-1/8' },
    { length: `4'`, railHeight: '37' },
  ],
  bottom: { type: 'level', length: '12', railHeight: '34', return: { on: 'yes', clearance: '2 1/4', gap: '1/8' } },
  brackets: { on: 'yes', way: 'field', field: '6; 40 1/2; 3 × 80', jointClear: '2' },
  weld: { on: 'yes', areaIn2: '0.03', efficiency: '0.93', lbPerHour: '5', arcOnPct: '30' },
  code: { on: 'yes', outsideDia: '1.66', wallClearance: '2 1/4' },
  volutes: { on: 'yes', top: '5' },
}

describe('a measure as text', () => {
  it('reads and writes at the paths that faults go by', () => {
    const changed = withText(everything, 'flights[1].pitch', '34')
    expect(textAt(changed, 'flights[1].pitch')).toBe('34')
    expect(changed.flights[0]).toBe(everything.flights[0])
    expect(textAt(withText(example, 'bottom.return.clearance', '3'), 'bottom.return.clearance')).toBe('3')
    expect(textAt(example, 'landings[7].length')).toBe('')
  })

  it('asks the engine exactly what the example says', () => {
    expect(inputsOf(example)).toEqual({ ...handrail.example })
  })

  it('names an empty measure of the chosen way', () => {
    const said = solve(inputsOf(withText(example, 'flights[1].nosingRise', '')))
    expect(said.ok ? [] : said.errors.map(({ field }) => field)).toEqual(['flights[1].nosingRise'])
  })

  it('leaves out the texts of the ways not chosen', () => {
    const changed = withText(example, 'flights[0].way', 'count')
    expect(inputsOf(changed).flights).toMatchObject([{ risers: ' ', run: '11' }, {}])
  })
})

describe('a measure in an address', () => {
  it.each([
    ['the example', example],
    ['everything at once', everything],
  ])('comes back as it was: %s', (_, measure) => {
    const text = new URLSearchParams(measureQuery(measure)).get('m')
    expect(inputsOf(readMeasure(text) ?? blankMeasure)).toEqual(inputsOf(measure))
  })

  it('is short enough for any address bar and keeps fractions legible', () => {
    expect(measureQuery(example).length).toBeLessThan(400)
    expect(measureQuery(example)).toContain('65+3/16')
  })

  it.each([null, '', 'nonsense', '!!!~~~', 'r~L~36'])('is none where there is no flight: %s', (text) => {
    expect(readMeasure(text)).toBeNull()
  })

  it('passes over blocks that it does not know', () => {
    const measure = readMeasure(`${writeMeasure(example)}!q~9~9`)
    expect(inputsOf(measure ?? blankMeasure)).toEqual(inputsOf(example))
  })
})

describe('saved inputs', () => {
  it('fill the sheet as numbers and give the same rail', () => {
    const first = solve(inputsOf(everything))
    if (!first.ok) throw new Error(JSON.stringify(first.errors))
    const again = solve(inputsOf(measureFromInputs(first.answer.inputs)))
    expect(again.ok && again.answer.outputs).toEqual(first.answer.outputs)
  })
})

describe('edits', () => {
  it('adds a landing with a flight and takes it away again', () => {
    const three = addFlight(example)
    expect(three.flights).toHaveLength(3)
    expect(three.landings).toHaveLength(2)
    expect(removeFlight(three, 2)).toEqual(example)
  })

  it('takes the landing above the lowest flight along', () => {
    const without = removeFlight(everything, 0)
    expect(without.flights).toEqual(everything.flights.slice(1))
    expect(without.landings).toEqual(everything.landings.slice(1))
  })

  it('changes no length with the hand', () => {
    const left = solve(inputsOf(example))
    const right = solve(inputsOf(mirrorHand(example)))
    if (!left.ok || !right.ok) throw new Error('the example must solve')
    expect(right.answer.outputs).toEqual({ ...left.answer.outputs, hand: 'R' })
  })
})
