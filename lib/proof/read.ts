import { readdir, readFile } from 'node:fs/promises'
import { join } from 'node:path'
import { proofFileSchema, type ProofRow } from './rows'

const folder = join(process.cwd(), 'content/proof')

/**
 * The published values of one calculator; none where nothing was found in print.
 * @throws ZodError when its file lacks a source or says something unknown.
 */
export async function readProof(calculator: string): Promise<ProofRow[]> {
  const name = `${calculator}.json`
  if (!(await readdir(folder)).includes(name)) return []
  return proofFileSchema.parse(JSON.parse(await readFile(join(folder, name), 'utf8'))).rows
}
