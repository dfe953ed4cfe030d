import { z } from './zod'

/** A JSON body or answer. */
export const json = (schema: z.ZodType, io: 'input' | 'output' = 'output') => ({
  'application/json': { schema: bare(schema, io) },
})

/** Inside an OpenAPI document the dialect is said once, at the top. */
export function bare(schema: z.ZodType, io: 'input' | 'output') {
  const document = z.toJSONSchema(schema, { io })
  delete document.$schema
  return document
}

/** A printable page. */
export const page = {
  description: 'One page, PDF',
  content: { 'application/pdf': { schema: { type: 'string', format: 'binary' } } },
}

/** A refusal in the form of RFC 9457. */
export const problem = (description: string) => ({
  description,
  content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
})

/** What any route that takes a body may refuse. */
export const refusals = {
  '400': problem('The body is not JSON.'),
  '413': problem('The body is over 64 KB.'),
  '422': problem('One message for each wrong field, saying what would be accepted.'),
}
