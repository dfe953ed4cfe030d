import katex from 'katex'
import { create, parseDependencies, type MathNode } from 'mathjs/number'
import type { AnyCalculator } from '@/lib/calculators/define'

/** A formula's name in TeX: the entry's own symbol, or the name in words. */
const symbolsOf = ({ inputs, outputs }: Pick<AnyCalculator, 'inputs' | 'outputs'>) => {
  const symbols = new Map<string, string>()
  for (const [name, field] of [...Object.entries(inputs), ...Object.entries(outputs)]) {
    if ('symbol' in field && typeof field.symbol === 'string') symbols.set(name, field.symbol)
  }
  return (name: string) => symbols.get(name) ?? `\\text{${wordsOf(name)}}`
}

/** `sawSquareIs0` as a person reads it: saw square is 0. */
const wordsOf = (name: string) => name.replace(/([a-z])([A-Z0-9])/g, '$1 $2').toLowerCase()

const { parse } = create(parseDependencies ?? {})

/** Formulas in math syntax as MathML, which browsers set by themselves: no style sheet, no font, read aloud as mathematics. */
export function typesetter(calculator: Pick<AnyCalculator, 'inputs' | 'outputs'>): (formula: string) => string {
  const symbol = symbolsOf(calculator)
  // A space before the name: what mathjs puts in front (\cdot) would otherwise run into it.
  const handler = (node: MathNode & { name?: string }) =>
    node.type === 'SymbolNode' && node.name !== undefined ? ` ${symbol(node.name)}` : undefined
  return (formula) => {
    const tex = parse(formula).toTex({ parenthesis: 'auto', implicit: 'hide', handler })
    return katex.renderToString(tex, { output: 'mathml', throwOnError: true, strict: 'error' })
  }
}
