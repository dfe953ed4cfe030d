import { spawnSync } from 'node:child_process'
import { existsSync, readFileSync } from 'node:fs'
import ts from 'typescript'

export interface Spread {
  count: number
  median: number
  p90: number
  largest: number
}

/** Lines of the files and of the functions that git knows, tests apart. */
export function sourceSizes(): { files: Spread; functions: Spread } {
  const { stdout } = spawnSync('git', ['ls-files', '*.ts', '*.tsx', '*.mjs'], { encoding: 'utf8' })
  const names = stdout.split('\n').filter((name) => name && !name.startsWith('tests/') && existsSync(name))
  const texts = names.map((name) => ({ name, text: readFileSync(name, 'utf8') }))
  return {
    files: spread(texts.map(({ text }) => text.trimEnd().split('\n').length)),
    functions: spread(texts.flatMap(({ name, text }) => functionLines(name, text))),
  }
}

/** Lines of every function with a block for a body. */
function functionLines(name: string, text: string): number[] {
  const file = ts.createSourceFile(name, text, ts.ScriptTarget.Latest, true)
  const lines: number[] = []
  const lineAt = (position: number) => file.getLineAndCharacterOfPosition(position).line
  const visit = (node: ts.Node) => {
    if (ts.isFunctionLike(node) && 'body' in node && node.body && ts.isBlock(node.body as ts.Node))
      lines.push(lineAt(node.getEnd()) - lineAt(node.getStart()) + 1)
    ts.forEachChild(node, visit)
  }
  visit(file)
  return lines
}

function spread(values: number[]): Spread {
  const sorted = values.toSorted((a, b) => a - b)
  const at = (share: number) => sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))] ?? 0
  return { count: sorted.length, median: at(0.5), p90: at(0.9), largest: at(1) }
}
