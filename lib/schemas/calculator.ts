import type { AnyCalculator } from '@/lib/calculators/define'
import type { Field, Fields, Unit } from '@/lib/calculators/fields'
import type { Output, Outputs } from '@/lib/calculators/outputs'
import { z } from './zod'

/** What POST /api/calculators/[id] takes: names and quantities, and the reader's tape and dial. */
export const askSchema = z.strictObject({
  inputs: z.record(z.string(), z.unknown()),
  precision: z.strictObject({ tape: z.number().optional(), dial: z.number().optional() }).optional(),
})

const measured: Partial<Record<Unit, string>> = {
  in: 'inches, or a tape reading such as 6\' 2 1/2", 74-1/2 in, 1892 mm',
  deg: 'degrees, or text such as 32.5 deg',
  'in/ft': 'inches per foot, or text such as 1/4 in/ft',
  in2: 'square inches',
  lb: 'pounds',
  'lb/h': 'pounds an hour',
  '%': 'percent',
}

/** The zod schema of a calculator's inputs, from its fields: the shape only, ranges and readings are the engine's. */
export function inputsSchema(fields: Fields): z.ZodType {
  return z.strictObject(Object.fromEntries(Object.entries(fields).map(([name, field]) => [name, fieldSchema(field)])))
}

function fieldSchema(field: Field): z.ZodType {
  const described = bareSchema(field).describe(describe(field))
  return field.fallback === undefined ? described : described.nullish()
}

function bareSchema(field: Field): z.ZodType {
  switch (field.kind) {
    case 'quantity':
    case 'whole':
      return z.union([z.number(), z.string()])
    case 'choice':
      return z.union([z.literal([...field.options]), z.literal(field.options.map(String))])
    case 'list':
      return z.array(fieldSchema(field.of)).min(field.least).max(field.most)
    case 'group':
      return inputsSchema(field.fields)
    case 'forms':
      return z.union(field.forms.map(inputsSchema))
  }
}

function describe(field: Field): string {
  const unit = field.kind === 'quantity' ? measured[field.unit] : undefined
  const range = 'sane' in field && field.sane ? `usually ${field.sane[0]} to ${field.sane[1]}` : undefined
  return [field.label, unit, range, field.hint].filter((part) => part !== undefined).join('; ')
}

/** The zod schema of what a calculator answers with, from its outputs. */
export function outputsSchema(outputs: Outputs): z.ZodType {
  return z.object(Object.fromEntries(Object.entries(outputs).map(([name, output]) => [name, outputSchema(output)])))
}

function outputSchema(output: Output): z.ZodType {
  switch (output.kind) {
    case 'value':
      return manyOf(valueSchema(output.unit)).nullish().describe(labelWithUnit(output.label, output.unit))
    case 'list':
      return z.array(outputSchema(output.of)).nullish().describe(output.label)
    case 'group':
      return outputsSchema(output.of).nullish().describe(output.label)
    case 'shape':
      return z.unknown().describe(output.label)
  }
}

/** A value may stand alone or as a row of marks. */
const manyOf = (schema: z.ZodType) => z.union([schema, z.array(schema)])

const labelWithUnit = (label: string, unit: string) =>
  unit === 'text' || unit === 'flag' ? label : `${label}, ${unit}`

function valueSchema(unit: string): z.ZodType {
  if (unit === 'text') return z.union([z.string(), z.number()])
  return unit === 'flag' ? z.boolean() : z.number()
}

/** One calculator as the API describes it. */
export function descriptionOf(calculator: AnyCalculator) {
  return {
    id: calculator.id,
    name: calculator.name,
    asks: calculator.asks,
    stage: calculator.stage,
    revision: calculator.revision,
    inputs: z.toJSONSchema(inputsSchema(calculator.inputs), { io: 'input' }),
    outputs: Object.fromEntries(Object.entries(calculator.outputs).map(([name, output]) => [name, outline(output)])),
    cautions: calculator.cautions.map(({ signal, text, beside }) => ({ signal, text, beside })),
    sources: calculator.sources,
    basis: calculator.basis,
  }
}

type Outline = { label: string; unit?: string; list?: Outline; group?: { [name: string]: Outline } }

function outline(output: Output): Outline {
  const { label } = output
  if (output.kind === 'value') return { label, unit: output.unit }
  if (output.kind === 'list') return { label, list: outline(output.of) }
  if (output.kind === 'group')
    return { label, group: Object.fromEntries(Object.entries(output.of).map(([name, of]) => [name, outline(of)])) }
  return { label }
}
