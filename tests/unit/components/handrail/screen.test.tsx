// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { HandrailScreen } from '@/components/calculator/handrail/handrail-screen'
import { measureFromInputs } from '@/components/calculator/handrail/measure-inputs'
import { measureStore } from '@/components/calculator/handrail/measure-store'
import { savedStore } from '@/components/calculator/handrail/use-handrail'
import { handrail } from '@/lib/calculators/field/handrail'

const draftKey = 'longpoint.handrail-draft'
const page = '/handbook/handrail'

beforeEach(() => {
  vi.stubGlobal('matchMedia', () => ({
    matches: false,
    addEventListener: () => undefined,
    removeEventListener: () => undefined,
  }))
  localStorage.clear()
  history.replaceState(null, '', page)
})
afterEach(() => {
  cleanup()
  vi.unstubAllGlobals()
})

function open(store = measureStore(measureFromInputs(handrail.example))) {
  render(<HandrailScreen store={store} typeset={{}} />)
  return store
}

const card = (name: string) => within(screen.getByRole('region', { name }))
const box = (path: string) => {
  const found = document.getElementById(`input-${path}`)
  if (!(found instanceof HTMLInputElement)) throw new Error(`there is no box at ${path}`)
  return found
}
const type = (path: string, value: string) => fireEvent.change(box(path), { target: { value } })
/** Marks of the parts listed, once the results have come. */
const marks = async () =>
  (await screen.findAllByRole('rowheader', {}, { timeout: 5000 })).map((cell) => cell.textContent?.charAt(0))

describe('the first visit', () => {
  it('shows the example as an example, with its parts', async () => {
    open()
    expect(screen.getByText('This is an example.')).toBeDefined()
    expect(await marks()).toEqual(['A', 'B', 'C', 'D'])
  })

  it('stands in climbing order', () => {
    open()
    const names = screen.getAllByRole('heading', { level: 2 }).map(({ textContent }) => textContent)
    const stair = ['Bottom end', 'Flight 1', 'Landing 1', 'Flight 2', 'Top end']
    expect(names.filter((name) => stair.includes(name ?? ''))).toEqual(stair)
  })
})

describe('adding, removing and taking back', () => {
  it('adds a landing with the flight, and says what the new ones need', async () => {
    open()
    await userEvent.click(screen.getByRole('button', { name: 'Add a flight' }))
    expect(card('Landing 2').getByText('Landing length is needed here.')).toBeDefined()
    expect(card('Flight 3').getByText('Rise, nosing to nosing is needed here.')).toBeDefined()
    expect(card('Flight 1').queryByText(/needed here/)).toBeNull()
  })

  it('brings a removed flight and its landing back as they were', async () => {
    open()
    await userEvent.click(screen.getByRole('button', { name: 'Remove flight 2' }))
    expect(screen.queryByRole('region', { name: 'Landing 1' })).toBeNull()
    expect(await marks()).toEqual(['A', 'B'])
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }))
    expect(box('landings[0].length').value).toBe('48')
    expect(box('flights[1].nosingRake').value).toBe('81 7/8')
    expect(await marks()).toEqual(['A', 'B', 'C', 'D'])
    expect(screen.getByText('This is an example.')).toBeDefined()
  })

  it('clears the example without leaving its rail behind, and undoes that too', async () => {
    open()
    await userEvent.click(screen.getByRole('button', { name: 'Clear it and put in your own' }))
    expect(box('railHeight').value).toBe('')
    expect(screen.queryByRole('table')).toBeNull()
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }))
    expect(box('railHeight').value).toBe('36')
  })

  it('mirrors the hand and keeps every length', async () => {
    open()
    const lengths = () => screen.getAllByRole('cell').map(({ textContent }) => textContent)
    await marks()
    const before = lengths()
    await userEvent.click(screen.getByRole('button', { name: 'Mirror the hand' }))
    expect(await screen.findByText(/Right hand rail going up/)).toBeDefined()
    expect(lengths()).toEqual(before)
  })
})

describe('what cannot be read', () => {
  it('is said at its box, leads there from the summary, and keeps the last rail dimmed', async () => {
    open()
    type('flights[1].nosingRun', '5,5')
    expect(box('flights[1].nosingRun').getAttribute('aria-invalid')).toBe('true')
    expect(card('Flight 2').getByText(/a comma could be thousands/)).toBeDefined()
    expect(await marks()).toEqual(['A', 'B', 'C', 'D'])
    expect(document.querySelector('.rail-results')?.hasAttribute('data-stale')).toBe(true)
    await userEvent.click(within(await screen.findByRole('region', { name: 'To mend' })).getByRole('link'))
    expect(document.activeElement).toBe(box('flights[1].nosingRun'))
    type('flights[1].nosingRun', '72')
    expect(screen.queryByRole('region', { name: 'To mend' })).toBeNull()
  })

  it('keeps what the other ways of measuring held', async () => {
    open()
    const flight = card('Flight 1')
    await userEvent.click(flight.getByRole('radio', { name: 'Count risers' }))
    expect(card('Flight 1').getByText('Risers is needed here.')).toBeDefined()
    await userEvent.click(card('Flight 1').getByRole('radio', { name: 'By tape' }))
    expect(box('flights[0].nosingRise').value).toBe('35')
  })

  it('sends back to the tape when three tapes do not close', () => {
    open()
    // 35 and 55 make 65.192 in along the slope: 3/8 in more than this.
    type('flights[0].nosingRake', '64 13/16')
    expect(card('Flight 1').getByText(/Measure again: the three tapes do not close by/).textContent).toContain('3/8"')
    type('flights[0].nosingRake', '65 3/16')
    expect(card('Flight 1').queryByText(/Measure again/)).toBeNull()
  })
})

describe('what is kept', () => {
  it('holds the measure in address and draft, and opens from either', () => {
    vi.useFakeTimers()
    open()
    type('railHeight', '34 1/2')
    vi.advanceTimersByTime(300)
    vi.useRealTimers()
    expect(location.search).toContain('34+1/2')
    expect(localStorage.getItem(draftKey)).toContain('34 1/2')
    cleanup()
    open()
    expect(box('railHeight').value).toBe('34 1/2')
    cleanup()
    history.replaceState(null, '', page)
    open()
    expect(box('railHeight').value).toBe('34 1/2')
  })

  it('opens a saved sheet over its own numbers, and leaves draft and sheet number alone', async () => {
    localStorage.setItem(draftKey, 'r~L~30!t~1~2')
    history.replaceState(null, '', `${page}?job=7&sheet=2&revision=1`)
    vi.useFakeTimers()
    open(savedStore({ ...handrail.example, railHeight: 37.5 }))
    expect(box('railHeight').value).toBe('37.5')
    type('railHeight', '38')
    vi.advanceTimersByTime(300)
    vi.useRealTimers()
    expect(new URLSearchParams(location.search).get('sheet')).toBe('2')
    expect(localStorage.getItem(draftKey)).toBe('r~L~30!t~1~2')
    expect(await screen.findByRole('button', { name: 'Save as a revision' }, { timeout: 5000 })).toBeDefined()
  })
})

describe('a part', () => {
  it('is lit everywhere when it is come to anywhere', async () => {
    open()
    await screen.findByText(/Left hand rail going up/)
    fireEvent.focus(screen.getByRole('button', { name: /^Part C/ }))
    expect(screen.getByRole('region', { name: 'Flight 2' }).hasAttribute('data-lit')).toBe(true)
    expect(screen.getByRole('region', { name: 'Flight 1' }).hasAttribute('data-lit')).toBe(false)
    expect(document.querySelector('[data-part="C"][data-on]')).not.toBeNull()
  })
})
