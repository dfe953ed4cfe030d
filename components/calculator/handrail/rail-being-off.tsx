'use client'

import { useDeferredValue, useMemo } from 'react'
import type { Precision } from '@/lib/calculators/fields'
import { fieldAt, placeOf } from './fields-at'
import type { Measure } from './measure'
import { railSlips, type RailSlip } from './rail-slips'
import type { Rail } from './use-handrail'

const offWords: Readonly<Record<RailSlip['off'], string>> = {
  in: '1/16 in',
  deg: '1/2°',
  'in/ft': '1/8 in per ft',
}

/** The costliest few tell where to tape twice. */
const told = 6

interface RailBeingOffProps {
  rail: Rail
  measure: Measure
  precision: Precision
}

/** What a small slip of each measure does to lengths and cuts: where it pays to tape twice. */
export function RailBeingOff({ rail, measure, precision }: RailBeingOffProps) {
  const given = useDeferredValue(rail.given)
  const slips = useMemo(() => railSlips(given, precision).slice(0, told), [given, precision])
  const lines = slips.flatMap(({ path, ...slip }) => {
    const label = fieldAt(measure, path)?.label.toLowerCase()
    return label === undefined ? [] : [{ ...slip, path, name: `${placeOf(path)}, ${label}` }]
  })
  if (lines.length === 0) return null
  return (
    <section aria-labelledby="being-off">
      <h2 id="being-off">Being off</h2>
      <ul className="being-off">
        {lines.map(({ path, name, off, length, cut }) => (
          <li key={path}>
            {name}: {offWords[off]} moves a part by {length.toFixed(3)} in and a cut by {cut.toFixed(2)}°.
          </li>
        ))}
      </ul>
    </section>
  )
}
