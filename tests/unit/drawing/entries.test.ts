import { describe, expect, it } from 'vitest'
import { drawingIds, loadDrawing } from '@/components/drawing/load'
import { viewportFor } from '@/components/drawing/plate-viewport'
import { answer } from '@/lib/calculators/answer'
import { loadCalculator } from '@/lib/calculators/load'
import { compose } from '@/lib/drawing/compose'
import { offPaper, overlaps, said } from './overlaps'

/** Drawings take what the entries really answer: names that drift apart show up here. */
describe.each([...drawingIds])('%s, as its calculator answers its own example', (id) => {
  it('draws without a hole in its numbers, on every shape of plate', async () => {
    const [calculator, draw] = await Promise.all([loadCalculator(id), loadDrawing(id)])
    if (!draw) throw new Error('no drawing')
    const answered = answer(calculator, calculator.example, { tape: 16, dial: 0.25 })
    if (!answered.ok) throw new Error(`the example of ${id} is not answered`)
    for (const [width, shape, detail] of [
      [340, 'strip', 'compact'],
      [340, 'trim', 'compact'],
      [760, 'plate', 'full'],
      [1120, 'trim', 'full'],
    ] as const) {
      const sketch = draw(answered.answer.inputs, answered.answer.outputs, { tape: 16, dial: 0.25, detail })
      const plate = compose(sketch, viewportFor(width, shape))
      expect(sketch.says).not.toMatch(/NaN|undefined|null|\[object/)
      expect(plate.labels.map(said).join(' ')).not.toMatch(/NaN|undefined|null/)
      expect([...overlaps(plate), ...offPaper(plate)]).toEqual([])
    }
  })
})
