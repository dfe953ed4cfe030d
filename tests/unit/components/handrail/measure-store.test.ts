// @vitest-environment jsdom
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { measureQuery, writeMeasure } from '@/components/calculator/handrail/measure-address'
import { removeFlight, turnExtra } from '@/components/calculator/handrail/measure-edits'
import { measureFromInputs } from '@/components/calculator/handrail/measure-inputs'
import { measureStore, type MeasureStore } from '@/components/calculator/handrail/measure-store'
import { blankMeasure, textAt, withText, type Measure } from '@/components/calculator/handrail/measure'
import { handrail } from '@/lib/calculators/field/handrail'

const example = measureFromInputs(handrail.example)
const page = '/handbook/handrail'
const mine = withText(example, 'railHeight', '34')
const draftKey = 'longpoint.handrail-draft'
const leave: (() => void)[] = []

beforeEach(() => {
  vi.useFakeTimers()
  localStorage.clear()
  history.replaceState(null, '', page)
})
afterEach(() => {
  for (const done of leave.splice(0)) done()
  vi.useRealTimers()
  vi.restoreAllMocks()
})

function open(search = '', saved = false): MeasureStore {
  for (const done of leave.splice(0)) done()
  history.replaceState(null, '', `${page}${search}`)
  const store = measureStore(example, saved)
  leave.push(store.subscribe(() => undefined))
  return store
}
const settle = () => vi.advanceTimersByTime(400)
const write = (store: MeasureStore, path: string, text: string) => store.type((now) => withText(now, path, text))
const height = (measure: Measure | null | undefined) => measure && textAt(measure, 'railHeight')

describe('taking back', () => {
  it('takes back what was taken back, with all that was typed in between', () => {
    const store = open()
    store.replace(removeFlight(example, 1), 'Flight 2 is gone.')
    write(store, 'railHeight', '35')
    store.undo()
    expect(store.now().measure).toEqual(example)
    expect(store.now().origin).toBe('example')
    store.undo()
    expect(store.now().measure.flights).toHaveLength(1)
    expect(height(store.now().measure)).toBe('35')
  })

  it('brings a cleared sheet back', () => {
    const store = open(measureQuery(mine))
    store.begin(blankMeasure, 'The sheet is cleared.')
    expect(store.now().measure).toEqual(blankMeasure)
    store.undo()
    expect(writeMeasure(store.now().measure)).toBe(writeMeasure(mine))
  })
})

describe('earlier measures', () => {
  it('keeps a cleared one on the device, even over a new visit', () => {
    const store = open(measureQuery(mine))
    store.begin(blankMeasure, 'The sheet is cleared.')
    write(store, 'railHeight', '38')
    settle()
    const again = open()
    expect(height(again.now().measure)).toBe('38')
    expect(height(again.now().earlier)).toBe('34')
  })

  it('does not lose an own measure to the address of somebody else', () => {
    localStorage.setItem(draftKey, writeMeasure(mine))
    const store = open(measureQuery(withText(example, 'railHeight', '37')))
    expect(height(store.now().earlier)).toBe('34')
    write(store, 'railHeight', '37 1/2')
    settle()
    const again = open()
    expect(height(again.now().measure)).toBe('37 1/2')
    expect(height(again.now().earlier)).toBe('34')
  })

  it('shows the example without touching what is kept', () => {
    localStorage.setItem(draftKey, writeMeasure(mine))
    const store = open()
    store.showExample()
    settle()
    expect(store.now().origin).toBe('example')
    expect(height(store.now().earlier)).toBe('34')
    expect(localStorage.getItem(draftKey)).toBe(writeMeasure(mine))
    store.begin(mine, 'Your earlier measure stands on the sheet.')
    expect(store.now().origin).toBe('own')
    expect(store.now().earlier).toBeNull()
  })

  it('are none of an empty sheet, of the sheet itself, or of a saved one', () => {
    localStorage.setItem(draftKey, writeMeasure(blankMeasure))
    expect(open(measureQuery(mine)).now().earlier).toBeNull()
    localStorage.setItem(draftKey, writeMeasure(mine))
    expect(open(measureQuery(mine)).now().earlier).toBeNull()
    expect(open('', true).now().earlier).toBeNull()
  })

  it('shows the example again once the cleared sheet was taken back', () => {
    const store = open()
    store.begin(blankMeasure, 'The sheet is cleared.')
    settle()
    store.undo()
    settle()
    expect(localStorage.getItem(draftKey)).toBeNull()
    expect(open().now().origin).toBe('example')
  })
})

describe('a device that keeps nothing', () => {
  it('still has all in the address', () => {
    const refuse = () => {
      throw new DOMException('full', 'QuotaExceededError')
    }
    vi.spyOn(Storage.prototype, 'setItem').mockImplementation(refuse)
    vi.spyOn(Storage.prototype, 'getItem').mockImplementation(refuse)
    const store = open()
    write(store, 'railHeight', '35 1/2')
    settle()
    expect(location.search).toBe(measureQuery(store.now().measure))
    expect(height(open(location.search).now().measure)).toBe('35 1/2')
  })
})

describe('an extra', () => {
  it('does not ask twice for what the sheet knows', () => {
    const returned = withText(withText(mine, 'top.return.on', 'yes'), 'top.return.clearance', '2 1/4')
    const asked = turnExtra(returned, 'code')
    expect(asked.code).toEqual({ on: 'yes', outsideDia: '1.66', wallClearance: '2 1/4' })
    const own = turnExtra(turnExtra(withText(asked, 'code.outsideDia', '1.9'), 'code'), 'code')
    expect(own.code.outsideDia).toBe('1.9')
  })

  it('holds its numbers while it is off', () => {
    const off = turnExtra(mine, 'stock')
    expect(off.stock).toMatchObject({ on: '', length: '240' })
    expect(turnExtra(off, 'stock')).toEqual(mine)
  })
})
