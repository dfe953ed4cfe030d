import { DatabaseError } from 'sequelize'
import { describe, expect, it } from 'vitest'
import { errorLine } from '@/lib/log'

const lineOf = (thrown: unknown) => JSON.stringify(errorLine(thrown))

describe('the log', () => {
  it('keeps of a database’s refusal its code, not the statement nor what was typed', () => {
    const sql = 'SELECT secret-typed'
    const refusal = new Error(`Unknown column 'x'\nsql: ${sql}`)
    const parent = Object.assign(refusal, { code: 'ER_BAD_FIELD_ERROR', sql, parameters: ['secret-typed'] })
    const line = lineOf(new DatabaseError(parent))
    expect(line).toContain('ER_BAD_FIELD_ERROR')
    expect(line).toContain('Unknown column')
    expect(line).toContain('log.test.ts')
    expect(line).not.toContain('secret-typed')
  })

  it('takes whatever is thrown', () => {
    expect(lineOf('secret-typed')).toBe('{"thrown":"string"}')
  })
})
