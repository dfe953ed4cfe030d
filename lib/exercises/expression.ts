import 'server-only'
import { create, parseDependencies, type MathNode } from 'mathjs/number'
import { acosDeg, asinDeg, atanDeg, cosDeg, sinDeg, tanDeg } from '@/lib/trade/angles'
import type { Read } from '@/lib/trade/quantity/read-length'

/** Longer than any sum a person types in a shop. */
const longest = 120
const deepest = 12

const accepted =
  'A sum may use + - * / ^, parentheses and sin, cos, tan, asin, acos, atan, sqrt, abs, all in degrees, such as atan(7/11)/2.'

/** All that may be called, in degrees. A Map, so that no inherited name answers. */
const functions = new Map<string, (x: number) => number>([
  ['sin', sinDeg],
  ['cos', cosDeg],
  ['tan', tanDeg],
  ['asin', asinDeg],
  ['acos', acosDeg],
  ['atan', (x) => atanDeg(x)],
  ['sqrt', Math.sqrt],
  ['abs', Math.abs],
])

const operators = new Map<string, (a: number, b: number) => number>([
  ['add', (a, b) => a + b],
  ['subtract', (a, b) => a - b],
  ['multiply', (a, b) => a * b],
  ['divide', (a, b) => a / b],
  ['pow', (a, b) => a ** b],
  ['unaryMinus', (a) => -a],
  ['unaryPlus', (a) => a],
])

// Only the parser is taken: the tree is worked out below, node by node, so that nothing else can run.
const { parse } = create(parseDependencies ?? {})

class Unreadable extends Error {}

/**
 * Works out a sum such as `atan(7/11)/2`, functions in degrees. Nothing but numbers, the listed functions and the
 * operators is understood. Runs on the server alone: mathjs is too large a load for a lesson.
 */
export function readExpression(typed: string): Read {
  const text = asPlainText(typed)
  if (text.length > longest) return { misread: `that is longer than a sum of ${longest} signs; shorten it.` }
  if (!/^[0-9a-z.+\-*/^() ]+$/.test(text)) return { misread: accepted }
  if (depthOf(text) > deepest) return { misread: `parentheses stand more than ${deepest} deep; write the sum simpler.` }
  const value = evaluate(text)
  if (value === undefined) return { misread: accepted }
  return Number.isFinite(value)
    ? { value }
    : { misread: 'that sum has no number as its answer: check what is divided.' }
}

/** The signs of phones and copied text for the same operators. */
const asPlainText = (typed: string) =>
  typed.replace(/[−–—]/g, '-').replace(/[×·]/g, '*').replace(/÷/g, '/').replace(/\s+/g, ' ').trim().toLowerCase()

function depthOf(text: string): number {
  let depth = 0
  let most = 0
  for (const sign of text) {
    if (sign === '(') most = Math.max(most, ++depth)
    if (sign === ')') depth--
  }
  return most
}

function evaluate(text: string): number | undefined {
  try {
    return valueOf(parse(text))
  } catch {
    // Whatever the parser stumbles over was not a sum.
    return undefined
  }
}

/** What the parser may hand over; every other kind of node is refused. */
type Node = MathNode & Partial<{ value: unknown; content: Node; fn: unknown; args: Node[]; implicit: boolean }>

function valueOf(node: Node): number {
  const { type, args = [] } = node
  if (type === 'ConstantNode' && typeof node.value === 'number') return node.value
  if (type === 'ParenthesisNode' && node.content) return valueOf(node.content)
  // `2(3)` and `2 in` are products the writer did not write.
  if (type === 'OperatorNode' && !node.implicit) return apply(operators.get(String(node.fn)), args)
  if (type === 'FunctionNode' && args.length === 1) return apply(functions.get(nameOf(node.fn)), args)
  throw new Unreadable(type)
}

function apply(work: ((a: number, b: number) => number) | undefined, args: readonly Node[]): number {
  const [a, b] = args
  if (!work || !a) throw new Unreadable()
  return work(valueOf(a), b ? valueOf(b) : NaN)
}

/** The name of a called function; empty for anything that is not a bare name. */
function nameOf(fn: unknown): string {
  return typeof fn === 'object' && fn !== null && 'name' in fn && typeof fn.name === 'string' ? fn.name : ''
}
