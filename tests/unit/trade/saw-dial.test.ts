import { describe, expect, it } from 'vitest'
import { sawDial } from '@/lib/trade/saw-dial'

describe('saw dial', () => {
  it('reads both scales of a cut within reach', () => {
    expect(sawDial({ fromSquare: 17.3121, sawMax: 45, step: 0.5 })).toEqual({
      squareIs0: 17.5,
      squareIs90: 72.5,
      overRange: false,
      ifOverRange: null,
    })
  })

  it('lays the stock at 90° to the fence for a cut past the stop', () => {
    expect(sawDial({ fromSquare: 57.5, sawMax: 45, step: 0.25 })).toMatchObject({ overRange: true, ifOverRange: 32.5 })
    expect(sawDial({ fromSquare: 45, sawMax: 45, step: 0.25 })).toMatchObject({ overRange: false })
  })

  it.each([
    ['fromSquare', { fromSquare: 91, sawMax: 45, step: 0.25 }],
    ['fromSquare', { fromSquare: -1, sawMax: 45, step: 0.25 }],
    ['sawMax', { fromSquare: 10, sawMax: 0, step: 0.25 }],
    ['step', { fromSquare: 10, sawMax: 45, step: 0 }],
  ])('refuses a %s that no saw has', (field, given) => {
    expect(sawDial(given)).toMatchObject({ refused: true, field })
  })
})
