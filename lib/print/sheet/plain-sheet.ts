import { standing, type Answer } from '@/lib/calculators/answer'
import type { AnyCalculator } from '@/lib/calculators/define'
import type { Sketch } from '@/lib/drawing/sketch'
import { showDial } from '@/lib/trade/quantity/dial'
import { foundRows } from './found-rows'
import { givenRows } from './given-rows'
import {
  particularsOf,
  underTitle,
  type Line,
  type Lists,
  type Picture,
  type Sheet,
  type SheetHead,
  type SheetReading,
} from './sheet'

export interface PlainSheetParts {
  head: SheetHead
  calculator: AnyCalculator
  answer: Answer
  sketch: Sketch | null
  reading: SheetReading
  address: string
}

/** One calculation on a sheet: what was given, what came out, drawn to scale, and how it works out. */
export function plainSheetOf({ head, calculator, answer, sketch, reading, address }: PlainSheetParts): Sheet {
  const { inputs, outputs, warnings } = answer
  const picture: Picture[] = sketch ? [{ kind: 'picture', title: 'To scale', sketch, as: 'main' }] : []
  const given = { title: 'Given', rows: givenRows(calculator.inputs, inputs, reading.precision) }
  const found = { title: 'Found', rows: foundRows(calculator.outputs, outputs, reading.precision) }
  const under = [head.job && calculator.name, underTitle(head)].filter(Boolean).join(' · ')
  return {
    title: head.job || calculator.name,
    under: under || calculator.asks,
    particulars: particularsOf(head),
    ...(head.kept?.supersededBy === undefined ? {} : { supersededBy: head.kept.supersededBy }),
    facts: [
      [`Lengths to 1/${reading.precision.tape} in`],
      [`Dial to ${showDial(reading.precision.dial, reading.precision.dial)}`],
      ['Saw ', { strong: `${reading.preferences.sawSquare} = square` }],
    ],
    blocks: [
      ...picture,
      ...(warnings.length > 0 ? [{ kind: 'remarks' as const, lines: warnings.map(({ message }) => [message]) }] : []),
      { kind: 'lists', lists: [given, found] },
      workingLists(answer),
    ],
    cautions: standing(calculator, inputs, outputs).map(({ signal, text }): Line => [
      { strong: signal.toUpperCase() },
      ` ${text}`,
    ]),
    address,
    reading,
  }
}

function workingLists({ steps, sources }: Answer): Lists {
  return {
    kind: 'lists',
    lists: [
      {
        title: 'How it works out',
        rows: steps.map(({ says, value }, i) => ({ name: String(i + 1), line: [{ strong: value }], under: [says] })),
      },
      {
        title: 'Sources',
        rows: sources.map(({ says, where }) => ({ name: '', line: [says], under: [where] })),
      },
    ],
  }
}
