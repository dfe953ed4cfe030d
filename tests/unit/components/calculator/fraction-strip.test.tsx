// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { FractionStrip } from '@/components/calculator/fraction-strip'
import { ticksOf } from '@/components/calculator/strip-ticks'

afterEach(cleanup)

function strip(den: number, part: number | null) {
  const onPick = vi.fn()
  render(<FractionStrip den={den} part={part} onPick={onPick} label="Fraction of the rise" />)
  const slider = screen.getByRole('slider', { name: 'Fraction of the rise' })
  vi.spyOn(slider, 'getBoundingClientRect').mockReturnValue(new DOMRect(0, 0, 358, 62))
  return { slider, onPick }
}

describe('the fraction strip', () => {
  it('picks the division nearest to the finger, ends included', () => {
    const { slider, onPick } = strip(16, 0)
    for (const clientX of [13, 13 + 332 / 2, 13 + (332 * 9.4) / 16, -20, 400])
      fireEvent.pointerDown(slider, { clientX })
    expect(onPick.mock.calls.flat()).toEqual([0, 8, 9, 0, 15])
  })

  it('slides while the finger is down, and not otherwise', () => {
    const { slider, onPick } = strip(4, 0)
    fireEvent.pointerMove(slider, { clientX: 179, buttons: 1 })
    fireEvent.pointerMove(slider, { clientX: 262, buttons: 0 })
    expect(onPick.mock.calls).toEqual([[2]])
  })

  it('steps by key, round past either end', () => {
    const { slider, onPick } = strip(16, 15 / 16)
    fireEvent.keyDown(slider, { key: 'ArrowRight' })
    fireEvent.keyDown(slider, { key: 'ArrowLeft' })
    fireEvent.keyDown(slider, { key: 'Tab' })
    expect(onPick.mock.calls.flat()).toEqual([0, 14])
  })

  it('says where the number lies', () => {
    expect(strip(16, 0.5).slider.getAttribute('aria-valuetext')).toBe('8/16')
    cleanup()
    expect(strip(16, null).slider.getAttribute('aria-valuetext')).toBe('none')
  })
})

describe('marks of an inch', () => {
  it.each([4, 8, 16, 32, 64])('are one more than its %i divisions, the shorter the oftener halved', (den) => {
    const ticks = ticksOf(den)
    expect(ticks).toHaveLength(den + 1)
    const length = (place: number) => ticks.find((tick) => tick.place === place)?.length ?? NaN
    const halvings = [1, 0.5, 0.25, 0.125, 0.0625].filter((place) => place >= 1 / den)
    halvings.slice(1).forEach((place, i) => expect(length(place)).toBeLessThan(length(halvings[i] ?? NaN)))
    expect(length(0.75)).toBe(length(0.25))
  })
})
