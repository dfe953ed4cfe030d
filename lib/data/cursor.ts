import { Op, type WhereOptions } from 'sequelize'
import { Unfit } from '@/lib/errors'
import { idField } from '@/lib/schemas/text'
import { z } from '@/lib/schemas/zod'

interface Place {
  updatedAt: Date
  id: string
}

const written = z.tuple([z.iso.datetime(), idField])

/** Where the next page begins, in a form that only passes through. */
export function cursorOf({ updatedAt, id }: Place): string {
  return Buffer.from(JSON.stringify([updatedAt.toISOString(), id])).toString('base64url')
}

/** The rows after a cursor, last changed first. @throws Unfit when it is none of ours. */
export function after(cursor: string | undefined): WhereOptions<Place> {
  if (cursor === undefined) return {}
  const [at, id] = read(cursor)
  const updatedAt = new Date(at)
  return { [Op.or]: [{ updatedAt: { [Op.lt]: updatedAt } }, { updatedAt, id: { [Op.lt]: id } }] }
}

function read(cursor: string): [string, string] {
  try {
    return written.parse(JSON.parse(Buffer.from(cursor, 'base64url').toString()))
  } catch {
    throw new Unfit([{ field: 'cursor', message: 'This is not where a page begins: start from the first one.' }])
  }
}
