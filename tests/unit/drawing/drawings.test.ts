import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { drawingIds, loadDrawing } from '@/components/drawing/load'
import { viewportFor } from '@/components/drawing/plate-viewport'
import { compose, type Viewport } from '@/lib/drawing/compose'
import { layText } from '@/lib/drawing/measure'
import type { Plate } from '@/lib/drawing/plate'
import type { Drawing, Show, Sketch } from '@/lib/drawing/sketch'
import { casesOf } from './cases'
import { offPaper, overlaps, said } from './overlaps'

/** As a phone's strip, a phone's plate, a desk and a printed sheet compose it. */
const sheets: { viewport: Viewport; detail: Show['detail'] }[] = [
  { viewport: viewportFor(340, 'strip'), detail: 'compact' },
  { viewport: viewportFor(340, 'plate'), detail: 'compact' },
  { viewport: viewportFor(760, 'plate'), detail: 'full' },
  { viewport: { width: 700, height: 400, textScale: 0.75, lineScale: 0.7, margin: 8 }, detail: 'full' },
]

async function drawingOf(id: string): Promise<Drawing> {
  const drawing = await loadDrawing(id)
  if (!drawing) throw new Error(`No drawing for ${id}`)
  return drawing
}

function faults(sketch: Sketch, viewport: Viewport): string[] {
  const plate = compose(sketch, viewport)
  return [
    ...overlaps(plate),
    ...offPaper(plate).map((what) => `${what} off the paper`),
    ...missing(sketch, plate).map((words) => `${words} is missing`),
  ]
}

/** Required labels whose words stand nowhere on the plate. */
function missing(sketch: Sketch, plate: Plate): string[] {
  const standing = plate.labels.map(said)
  return sketch.labels
    .filter((label) => label.required)
    .map((label) => said(layText(label.text, label.size, 1)))
    .filter((words) => {
      const at = standing.indexOf(words)
      if (at >= 0) standing.splice(at, 1)
      return at < 0
    })
}

describe('the list of drawings', () => {
  it('has cases for every drawing, and no others', () => {
    expect(Object.keys(casesOf).sort()).toEqual([...drawingIds].sort())
  })

  it('knows no drawing of an unknown calculator', () => {
    expect(loadDrawing('no-such-thing')).toBeNull()
  })
})

describe.each([...drawingIds])('%s', (id) => {
  const { extremes, any, solve } = casesOf[id] ?? { extremes: [], any: fc.constant({}), solve: () => null }

  it.each(sheets)(
    'keeps every label clear at the ends of its range, $viewport.width × $viewport.height px',
    async ({ viewport, detail }) => {
      const draw = await drawingOf(id)
      for (const given of extremes) {
        const solved = solve(given)
        expect(solved, JSON.stringify(given)).not.toBeNull()
        const sketch = draw({ ...given }, { ...solved }, { tape: 16, dial: 0.25, detail })
        expect({ given, faults: faults(sketch, viewport) }).toEqual({ given, faults: [] })
      }
    },
  )

  it('keeps every label clear on any numbers', { timeout: 60_000 }, async () => {
    const draw = await drawingOf(id)
    let drawn = 0
    fc.assert(
      fc.property(
        any,
        fc.constantFrom(...sheets),
        fc.constantFrom(16 as const, 64 as const),
        (given, { viewport, detail }, tape) => {
          const solved = solve(given)
          if (!solved) return
          drawn++
          expect(faults(draw({ ...given }, { ...solved }, { tape, dial: 0.25, detail }), viewport)).toEqual([])
        },
      ),
      { numRuns: 40 },
    )
    expect(drawn).toBeGreaterThan(10) // always refused would prove nothing
  })

  it('says its numbers in words', async () => {
    const draw = await drawingOf(id)
    for (const given of extremes) {
      const { says } = draw({ ...given }, { ...solve(given) }, { tape: 16, dial: 0.25, detail: 'full' })
      expect(says).toMatch(/\d/)
      expect(says).not.toMatch(/NaN|undefined|null|\[object/)
    }
  })

  it('draws metric too', async () => {
    const draw = await drawingOf(id)
    for (const given of extremes) {
      const sketch = draw({ ...given }, { ...solve(given) }, { tape: 16, dial: 0.25, detail: 'full', metric: true })
      expect(faults(sketch, { width: 760, height: 590, margin: 22 })).toEqual([])
    }
  })
})
