'use client'

import { useCallback, useDeferredValue } from 'react'
import type { Show } from '@/lib/drawing/sketch'
import { draw } from '../../drawing/handrail'
import { Plate } from '../../drawing/plate'
import { usePhone } from '../use-phone'
import { useLit } from './lit'
import type { HandrailState, Rail } from './use-handrail'

interface RailPlateProps extends Pick<HandrailState, 'precision' | 'preferences' | 'stale'> {
  rail: Rail
}

/** The whole rail over its stair, of these very numbers. It may follow a moment after the typing. */
export function RailPlate({ rail, precision, preferences, stale }: RailPlateProps) {
  const phone = usePhone()
  const { lit, light } = useLit()
  const { given, solved } = useDeferredValue(rail)
  const metric = preferences.units === 'mm'
  const sketch = useCallback(
    (detail: Show['detail']) => draw(given, solved, { ...precision, metric, detail: phone ? 'compact' : detail }),
    [given, solved, precision, metric, phone],
  )
  return (
    <div className="rail-plate" data-stale={stale || undefined}>
      <Plate
        sketch={sketch}
        title="The rail in elevation"
        shape={phone ? 'strip' : 'plate'}
        highlight={lit}
        onHighlight={light}
      />
    </div>
  )
}
