'use client'

import { useCallback } from 'react'
import type { Show } from '@/lib/drawing/sketch'
import type { HandrailOutputs, RailSticks } from '@/lib/trade/rail/types'
import { sticksText } from '@/lib/trade/rail/words'
import { drawSticks } from '../../drawing/handrail-sticks'
import { Plate } from '../../drawing/plate'
import { Tape } from '../../ui/tape'
import { useLit } from './lit'
import type { Reading } from './reading-of'
import type { Rail } from './use-handrail'

/** The bars to scale with the parts laid in them, and what drops off. */
export function LaidSticks({ stock, rail, reading }: { stock: RailSticks; rail: Rail; reading: Reading }) {
  const { lit, light } = useLit()
  const { precision, preferences } = reading
  const { given, solved } = rail
  const metric = preferences.units === 'mm'
  const sketch = useCallback(
    (detail: Show['detail']) => sketchOf({ given, solved }, { ...precision, metric, detail }),
    [given, solved, precision, metric],
  )
  return (
    <>
      <p className="rail-says">
        {sticksText(stock)}. {stock.yieldPct.toFixed(0)} % used; {stock.drops.length === 1 ? 'the drop is ' : 'drops '}
        {stock.drops.map((drop, i) => (
          <span key={i}>
            {i > 0 && ', '}
            <Tape inches={drop} den={precision.tape} units={preferences.units} />
          </span>
        ))}
        .
      </p>
      <Plate sketch={sketch} title="Sticks" tone="paper" shape="trim" highlight={lit} onHighlight={light} />
    </>
  )
}

const sketchOf = ({ given, solved }: { given: Rail['given']; solved: HandrailOutputs }, show: Show) =>
  drawSticks(given, solved, show) ?? { strokes: [], labels: [], says: '' }
