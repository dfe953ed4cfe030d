import { sheetOf } from '@/components/sheet/sheet-of'
import { computeCalculator } from '@/lib/calculators/compute'
import { defaultPrecision } from '@/lib/calculators/fields'
import type { CalculatorId } from '@/lib/calculators/load'
import {
  blankHead,
  type Line,
  type Piece,
  type Sheet,
  type SheetHead,
  type SheetReading,
} from '@/lib/print/sheet/sheet'
import { showDial } from '@/lib/trade/quantity/dial'
import { showTape } from '@/lib/trade/quantity/tape'

interface Asked {
  head?: Partial<SheetHead>
  preferences?: Partial<SheetReading['preferences']>
}

const reading = ({ preferences }: Asked): SheetReading => ({
  precision: defaultPrecision,
  preferences: { units: 'in', sawSquare: 0, ...preferences },
})

/** The sheet of a calculator's inputs. Throws where they are refused. */
export async function printed(id: CalculatorId, inputs: unknown, asked: Asked = {}): Promise<Sheet> {
  const computed = await computeCalculator(id, inputs)
  if (!computed.ok) throw new Error(computed.errors.map(({ message }) => message).join(' '))
  const parts = {
    head: { ...blankHead, ...asked.head },
    reading: reading(asked),
    address: 'https://longpoint.example/',
  }
  return sheetOf(id, { ...parts, answer: computed.answer })
}

const pieceText = (piece: Piece): string => {
  if (typeof piece === 'string') return piece
  if ('strong' in piece) return piece.strong
  if ('tape' in piece) return showTape(piece.tape, defaultPrecision.tape)
  return 'dial' in piece ? showDial(piece.dial, defaultPrecision.dial) : piece.face
}

/** A line as it is read aloud. */
export const lineText = (line: Line): string => line.map(pieceText).join('')

/** Everything a sheet says in words and numbers, a line each. */
export function sheetText({ title, under, particulars, facts, blocks, cautions }: Sheet): string[] {
  const inBlocks = blocks.flatMap((block) => {
    if (block.kind === 'table')
      return [...block.rows.flat().flatMap(({ line, under: small = [] }) => [line, small]), block.key ?? []]
    if (block.kind === 'lists')
      return block.lists.flatMap(({ rows }) =>
        rows.flatMap(({ name, line, under: small = [] }) => [[name], line, small]),
      )
    return block.kind === 'remarks' ? block.lines : [[block.says ?? '']]
  })
  return [title, under, ...[...particulars, ...facts, ...inBlocks, ...cautions].map(lineText)].filter(
    (text) => text !== '',
  )
}
