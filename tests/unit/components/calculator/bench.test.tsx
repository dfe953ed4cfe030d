// @vitest-environment jsdom
import { act, cleanup, render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { Suspense } from 'react'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { CalculatorOnFront } from '@/components/calculator/calculator-on-front'
import { loadParts } from '@/components/calculator/parts'

vi.mock('@/components/drawing/plate', () => ({ Plate: ({ title }: { title: string }) => <p>{title}</p> }))

beforeEach(() => {
  vi.stubGlobal('matchMedia', () => ({ matches: false, addEventListener: vi.fn(), removeEventListener: vi.fn() }))
  history.replaceState(null, '', '/')
})
afterEach(() => {
  cleanup()
  vi.unstubAllGlobals()
})

async function open(search = '') {
  history.replaceState(null, '', `/${search}`)
  await loadParts('miter')
  await act(async () => {
    render(
      <Suspense fallback="waiting">
        <CalculatorOnFront id="miter" />
      </Suspense>,
    )
  })
  return { below: screen.getByLabelText<HTMLInputElement>('Slope below the knuckle'), user: userEvent.setup() }
}

const answer = () => document.querySelector('.result-value')?.textContent
const addressSays = (name: string) => new URLSearchParams(location.search).get(name)

describe('the bench', () => {
  it('answers the moment a number can be read', async () => {
    const { below, user } = await open()
    await user.clear(below)
    await user.type(below, '32.5')
    // Half of 32.5° is 16.25°, and the dial has that mark.
    expect(answer()).toContain('16 1/4°')
  })

  it('takes its numbers from the address', async () => {
    const { below } = await open('?slopeBelow=20&slopeAbove=-4')
    expect(below.value).toBe('20')
    expect(answer()).toContain('12°')
  })

  it('leaves alone what else the address says, such as the sheet that is being revised', async () => {
    const { below, user } = await open('?slopeBelow=20&job=7&sheet=2&revision=1')
    await user.clear(below)
    await user.type(below, '24')
    await expect.poll(() => addressSays('slopeBelow')).toBe('24')
    expect([addressSays('job'), addressSays('sheet'), addressSays('revision')]).toEqual(['7', '2', '1'])
  })

  it('loses nothing when the router writes an older address over a newer one', async () => {
    const { below, user } = await open('?slopeBelow=20&slopeAbove=-4')
    await user.clear(below)
    await user.type(below, '24')
    await expect.poll(() => addressSays('slopeBelow')).toBe('24')
    history.replaceState(null, '', '/?slopeBelow=20&slopeAbove=-4')
    await user.type(screen.getByLabelText('Slope above the knuckle'), '.5')
    expect(below.value).toBe('24')
    expect(answer()).toContain('14 1/4°')
    await expect.poll(() => [addressSays('slopeBelow'), addressSays('slopeAbove')]).toEqual(['24', '-4.5'])
  })

  it('keeps what was typed, and the last answer, beside the sentence on what is off', async () => {
    const { below, user } = await open('?slopeBelow=20')
    await user.clear(below)
    await user.type(below, 'steep')
    expect(below.value).toBe('steep')
    expect(below.getAttribute('aria-invalid')).toBe('true')
    const described = below.getAttribute('aria-describedby')?.split(' ')[0] ?? ''
    expect(document.getElementById(described)?.textContent).toMatch(/^Slope below the knuckle: /)
    expect(answer()).toContain('10°')
    expect(document.querySelector('.results')?.hasAttribute('data-stale')).toBe(true)
  })

  it('puts the numbers into the address a moment later, and follows it back', async () => {
    const { below, user } = await open()
    await user.clear(below)
    await user.type(below, '30')
    await vi.waitFor(() => expect(addressSays('slopeBelow')).toBe('30'))
    expect(addressSays('depth')).toBe('1 1/2')
    history.replaceState(null, '', '/?slopeBelow=24')
    act(() => void window.dispatchEvent(new PopStateEvent('popstate')))
    expect(below.value).toBe('24')
  })
})
