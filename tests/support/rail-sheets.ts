import { railSheet } from '@/components/sheet/rail-sheet'
import { computeCalculator } from '@/lib/calculators/compute'
import { handrail } from '@/lib/calculators/field/handrail'
import { blankHead, type Sheet, type SheetHead, type SheetReading } from '@/lib/print/sheet/sheet'

const precision = { tape: 16, dial: 0.25 } as const

export const quarryHead: SheetHead = {
  ...blankHead,
  job: 'Quarry Street walk-up',
  sheet: 'Stoop rail, two flights and landing',
  measuredBy: 'R. Bell',
  measuredOn: '2026-11-24',
  instrument: 'tape, plumb',
}

interface Asked {
  head?: SheetHead
  preferences?: Partial<SheetReading['preferences']>
  address?: string
}

/** The cut sheet of a rail as the app draws it. Throws when the rail is refused. */
export async function sheetOfRail(
  inputs: unknown,
  { head = quarryHead, preferences, address }: Asked = {},
): Promise<Sheet> {
  const answered = await computeCalculator('handrail', inputs, precision)
  if (!answered.ok) throw new Error(JSON.stringify(answered.errors))
  return railSheet({
    head,
    answer: answered.answer,
    reading: { precision, preferences: { units: 'in', sawSquare: 0, ...preferences } },
    address: address ?? 'https://longpoint.example/jobs/7/sheets/1',
  })
}

/** The rail of the handbook: two flights, a landing, parts A to D. */
export const handbookRail: Readonly<Record<string, unknown>> = handrail.example

/** A rail up a tower of so many flights, no two alike. */
export function towerRail(flights: number): Record<string, unknown> {
  const climb = Array.from({ length: flights }, (_, i) => ({
    risers: 6 + (i % 5),
    rise: 6.5 + (i % 3) * 0.25,
    run: 10.5 + (i % 4) * 0.5,
  }))
  return { ...handbookRail, flights: climb, landings: climb.slice(1).map(() => ({ length: 48 })) }
}

/** The marks of a sheet's table, from its lowest part up. */
export const marksOf = ({ blocks }: Sheet): string[] =>
  blocks.flatMap((block) =>
    block.kind === 'table'
      ? block.rows.flatMap(([cell]) =>
          (cell?.line ?? []).flatMap((piece) => (typeof piece === 'object' && 'strong' in piece ? piece.strong : [])),
        )
      : [],
  )
