import type { AnyCalculator, Values } from '@/lib/calculators/define'
import type { OutputValue } from '@/lib/calculators/outputs'

export interface ShownOutput {
  name: string
  output: OutputValue
  value: unknown
}

/** An entry that gives both readings of a saw names them alike but for the end. */
const twinAt90 = (name: string) => name.replace(/Is0$/, 'Is90')

/** The glanceable outputs in order, each in the reading of the reader's own saw. */
export function glanceOf(calculator: AnyCalculator, outputs: Values, sawSquare: 0 | 90): ShownOutput[] {
  const names = calculator.glance.map((name) =>
    sawSquare === 90 && calculator.outputs[twinAt90(name)] ? twinAt90(name) : name,
  )
  return [...new Set(names)].flatMap((name) => {
    const output = calculator.outputs[name]
    return output?.kind === 'value' && outputs[name] !== undefined ? [{ name, output, value: outputs[name] }] : []
  })
}
