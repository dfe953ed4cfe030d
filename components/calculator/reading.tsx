import type { OutputValue } from '@/lib/calculators/outputs'
import type { Precision } from '@/lib/calculators/fields'
import { valueText } from '@/lib/calculators/text'
import { Dial, Tape } from '../ui/tape'

interface ReadingProps {
  output: OutputValue
  value: unknown
  precision: Precision
  units: 'in' | 'mm'
}

const mmPerInch = 25.4

/** One value as it is read: to the tape, to the dial, or with its unit. */
export function Reading({ output, value, precision, units }: ReadingProps) {
  if (value === null || value === undefined) return <>none</>
  if (typeof value === 'number' && output.round === 'tape')
    return <Tape inches={value} den={precision.tape} units={units} />
  if (typeof value === 'number' && output.round === 'dial') return <Dial deg={value} step={precision.dial} />
  if (typeof value === 'number' && output.unit === 'in' && units === 'mm')
    return <>{(value * mmPerInch).toFixed(2)} mm</>
  return <>{valueText(output, value, precision)}</>
}
