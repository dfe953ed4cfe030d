import { describe, expect, it } from 'vitest'
import { draw } from '@/components/drawing/handrail'
import { compose } from '@/lib/drawing/compose'
import { mirror } from '@/lib/drawing/mirror'
import { angleArc, path, spot } from '@/lib/drawing/strokes'
import { shape, word } from '@/lib/drawing/text'
import { solveHandrail } from '@/lib/trade/rail/solve'
import { isRefusal } from '@/lib/trade/refusal'
import { extremeRails } from './rails'

const show = { tape: 16, dial: 0.25, detail: 'full' } as const

describe('mirror', () => {
  const arrow = [[word('UP '), shape('arrow')]]
  const sketch = {
    strokes: [path('object', [spot(0, 0), spot(10, 5, 3, 4)]), angleArc(spot(2, 0), 40, 0, 30)],
    labels: [
      {
        kind: 'along',
        text: arrow,
        size: 'number',
        from: spot(0, 0),
        to: spot(10, 5),
        side: 'above',
        required: true,
      } as const,
    ],
    says: 'A line going up.',
  }

  it('turns points and their paper offsets about the middle', () => {
    const [line, arc] = mirror(sketch).strokes
    expect(line).toMatchObject({ points: [{ y: 0 }, { x: -10, y: 5, dx: -3, dy: 4 }] })
    expect(arc).toMatchObject({ from: 150, to: 180 })
  })

  it('points the arrow the other way, ahead of its word', () => {
    expect(mirror(sketch).labels[0]?.text).toMatchObject([
      [
        { kind: 'shape', shape: 'arrow-left' },
        { kind: 'word', text: ' UP' },
      ],
    ])
  })

  it('shows a right hand rail as the left one going up the other way, part for part as long', () => {
    const given = extremeRails[5]
    if (!given) throw new Error('no rail')
    const lengths = (['L', 'R'] as const).map((hand) => {
      const solved = solveHandrail({ ...given, hand }, { tape: 16, dial: 0.25 })
      if (isRefusal(solved)) throw new Error('refused')
      const plate = compose(draw({ ...given, hand }, solved, show), { width: 760, height: 590 })
      const bars = plate.marks.filter((mark) => mark.ink === 'object' && mark.closed)
      return bars.map(({ points: [a, b] }) =>
        a && b ? { run: (b.x - a.x) / plate.scale, up: (a.y - b.y) / plate.scale } : null,
      )
    })
    const [left = [], right = []] = lengths
    expect(left.length).toBeGreaterThan(1)
    left.forEach((bar, i) => {
      expect(right[i]?.run).toBeCloseTo(-(bar?.run ?? NaN), 2)
      expect(right[i]?.up).toBeCloseTo(bar?.up ?? NaN, 2)
    })
  })
})
