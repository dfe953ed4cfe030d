import { readdir, readFile } from 'node:fs/promises'
import { join } from 'node:path'
import { compareRow, type Compared } from './compare'
import { rowsOf, type ProofRow } from './rows'

const folder = join(process.cwd(), 'content/proof')

/** Ids of the calculators that published values stand for. */
export async function provedCalculators(): Promise<string[]> {
  const files = await readdir(folder)
  return files.filter((name) => name.endsWith('.json')).map((name) => name.slice(0, -'.json'.length))
}

/** The published values of one calculator; none where nothing was found in print. */
export async function readProof(calculator: string): Promise<ProofRow[]> {
  if (!(await provedCalculators()).includes(calculator)) return []
  return rowsOf(JSON.parse(await readFile(join(folder, `${calculator}.json`), 'utf8')))
}

/** Every published value of one calculator beside ours, in the order of its file. */
export async function compareProof(calculator: string): Promise<Compared[]> {
  const rows = await readProof(calculator)
  return Promise.all(rows.map((row) => compareRow(calculator, row)))
}
