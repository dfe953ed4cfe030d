import type { Answer } from '@/lib/calculators/answer'
import { loadCalculator, type CalculatorId } from '@/lib/calculators/load'
import { plainSheetOf } from '@/lib/print/sheet/plain-sheet'
import type { Sheet } from '@/lib/print/sheet/sheet'
import { writeAddress, type RawInputs } from '../calculator/address'
import { loadDrawing } from '../drawing/load'
import { railPath, railSheet, type SheetOfAnswer } from './rail-sheet'

/** A page laid out by hand has a sheet and an address of its own. */
interface OwnSheet {
  sheet: (parts: SheetOfAnswer) => Sheet
  path: (inputs: RawInputs) => string
}
const own: Readonly<Partial<Record<CalculatorId, OwnSheet>>> = { handrail: { sheet: railSheet, path: railPath } }

/** The printable sheet of a whole answer, of any calculator. */
export async function sheetOf(id: CalculatorId, parts: SheetOfAnswer & { answer: Answer }): Promise<Sheet> {
  const known = own[id]
  if (known) return known.sheet(parts)
  const { answer, reading } = parts
  const draw = await loadDrawing(id)
  const show = { ...reading.precision, metric: reading.preferences.units === 'mm', detail: 'full' as const }
  const sketch = draw ? draw(answer.inputs, answer.outputs, show) : null
  return plainSheetOf({ ...parts, calculator: await loadCalculator(id), sketch })
}

/** Path of the handbook's page with these inputs on it. */
export async function handbookPath(id: CalculatorId, inputs: RawInputs): Promise<string> {
  return own[id]?.path(inputs) ?? `/handbook/${id}${writeAddress((await loadCalculator(id)).inputs, inputs)}`
}
