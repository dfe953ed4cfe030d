import { describe, expect, it } from 'vitest'
import { drawSticks } from '@/components/drawing/handrail-sticks'
import { compose } from '@/lib/drawing/compose'
import { solveHandrail } from '@/lib/trade/rail/solve'
import type { HandrailInputs } from '@/lib/trade/rail/types'
import { isRefusal } from '@/lib/trade/refusal'
import { offPaper, overlaps } from './overlaps'
import { extremeRails } from './rails'

const show = { tape: 16, dial: 0.25, detail: 'full' } as const

function drawn(given: HandrailInputs) {
  const solved = solveHandrail(given, { tape: 16, dial: 0.25 })
  if (isRefusal(solved)) throw new Error('refused')
  return { solved, sketch: drawSticks(given, solved, show) }
}

describe('drawSticks', () => {
  const bent = extremeRails[7]
  if (!bent) throw new Error('no rail')

  it('lays every part in a stick, to scale and under its own mark', () => {
    const { solved, sketch } = drawn(bent)
    if (!sketch) throw new Error('nothing drawn')
    const plate = compose(sketch, { width: 760, height: 590, trim: true })
    for (const part of solved.parts) {
      const bar = plate.marks.find((mark) => mark.part === part.mark)
      const xs = bar?.points.map((p) => p.x) ?? []
      expect((Math.max(...xs) - Math.min(...xs)) / plate.scale).toBeCloseTo(part.overall, 2)
    }
    expect([...overlaps(plate), ...offPaper(plate)]).toEqual([])
  })

  it('draws nothing when no stock was given, or a part is longer than the stick', () => {
    expect(drawn({ ...bent, stock: null }).sketch).toBeNull()
    expect(drawn({ ...bent, stock: { length: 24, kerf: 0.0625 } }).sketch).toBeNull()
  })
})
