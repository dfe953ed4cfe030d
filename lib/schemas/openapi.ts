import type { AnyCalculator } from '@/lib/calculators/define'
import { askSchema, descriptionOf, inputsSchema, outputsSchema } from './calculator'
import { bare, json, page, problem, refusals } from './openapi-parts'
import { shopPaths } from './openapi-shop'
import { sheetAskSchema } from './sheet'
import { problemSchema } from './views'
import { z } from './zod'

const stepSchema = z.object({
  says: z.string(),
  formula: z.string().optional(),
  substituted: z.string().optional(),
  value: z.string(),
})

const noteSchema = z.object({ field: z.string().optional(), message: z.string() })
const sourceSchema = z.object({ says: z.string(), where: z.string() })

function answerSchema(calculator: AnyCalculator) {
  return z.object({
    id: z.literal(calculator.id),
    revision: z.number().int(),
    inputs: z.record(z.string(), z.unknown()).describe('As understood, in inches and degrees'),
    outputs: outputsSchema(calculator.outputs),
    text: z.record(z.string(), z.unknown()).describe('The outputs as a tape or a dial shows them'),
    steps: z.array(stepSchema),
    warnings: z.array(noteSchema),
    sources: z.array(sourceSchema),
  })
}

function pathsOf(calculator: AnyCalculator) {
  const path = `/api/calculators/${calculator.id}`
  const tags = [calculator.stage]
  const inputs = inputsSchema(calculator.inputs)
  return {
    [path]: {
      get: {
        operationId: `describe-${calculator.id}`,
        summary: `What ${calculator.name} takes and gives`,
        tags,
        responses: { '200': { description: 'The description', content: json(z.record(z.string(), z.unknown())) } },
      },
      post: {
        operationId: calculator.id,
        summary: calculator.asks,
        description: calculator.lede,
        tags,
        requestBody: { required: true, content: json(askSchema.extend({ inputs }), 'input') },
        responses: { '200': { description: 'The answer', content: json(answerSchema(calculator)) }, ...refusals },
      },
    },
    [`${path}/sheet`]: {
      post: {
        operationId: `sheet-${calculator.id}`,
        summary: `The printable sheet of ${calculator.name}`,
        tags,
        requestBody: { required: true, content: json(sheetAskSchema.extend({ inputs }), 'input') },
        responses: {
          '200': page,
          ...refusals,
          '429': problem('Too many sheets asked for; the answer says when to come back.'),
        },
      },
    },
  }
}

/** The OpenAPI 3.1 description of the whole API, made from the very schemas and fields that are served. */
export function openapi(calculators: readonly AnyCalculator[]) {
  return {
    openapi: '3.1.0',
    info: {
      title: 'Longpoint',
      version: '1',
      description:
        'Shop calculators for stair rail work, open to everybody, and the job book of those who sign in. Lengths in inches and angles in degrees unless a unit says otherwise. The adopted local code and a licensed professional decide.',
      license: { name: 'MIT', identifier: 'MIT' },
    },
    servers: [{ url: '/' }],
    security: [],
    tags: [...new Set(calculators.map(({ stage }) => stage))].map((name) => ({ name })),
    paths: {
      '/api/calculators': {
        get: {
          operationId: 'list-calculators',
          summary: 'Every calculator with its inputs and outputs',
          responses: { '200': { description: 'The list', content: json(z.array(z.record(z.string(), z.unknown()))) } },
        },
      },
      ...Object.assign({}, ...calculators.map(pathsOf)),
      ...shopPaths,
    },
    components: {
      schemas: { Problem: bare(problemSchema, 'output') },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'longpoint.session' } },
    },
  }
}

/** The list that GET /api/calculators gives. */
export const listing = (calculators: readonly AnyCalculator[]) => calculators.map(descriptionOf)
