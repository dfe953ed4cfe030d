import { inflateSync } from 'node:zlib'

/** Values of a PDF as it writes them: names with their slash, strings as bytes of latin1, operators of a page apart. */
export type Value = number | string | boolean | null | Bytes | Ref | Operator | Value[] | Dict
export type Dict = Map<string, Value>
export interface Bytes {
  bytes: string
}
export interface Ref {
  ref: number
}
export interface Operator {
  operator: string
}

export const isDict = (value: unknown): value is Dict => value instanceof Map
export const isBytes = (value: unknown): value is Bytes =>
  typeof value === 'object' && value !== null && 'bytes' in value
export const isOperator = (value: unknown): value is Operator =>
  typeof value === 'object' && value !== null && 'operator' in value
const isRef = (value: unknown): value is Ref => typeof value === 'object' && value !== null && 'ref' in value

const token =
  /[\s\0]*(?:%[^\r\n]*[\s\0]*)*(?:(\d+)[ \r\n]+\d+[ \r\n]+R(?![a-zA-Z])|([-+]?(?:\d+\.?\d*|\.\d+)(?:[eE]-?\d+)?)|(\/[^\s\0/<>[\](){}%]*)|(<<|>>|\[|\]|<|\()|([^\s\0/<>[\](){}%]+))/y

/** Reads one value after another from `from` on; null at the end or at a closing bracket, which it passes. */
export class Scanner {
  constructor(
    private readonly text: string,
    public at = 0,
  ) {}

  /** The next value, or undefined at the end. */
  next(): Value | undefined {
    token.lastIndex = this.at
    const found = token.exec(this.text)
    if (!found) return undefined
    this.at = token.lastIndex
    const [, ref, number, name, bracket, word] = found
    if (ref !== undefined) return { ref: Number(ref) }
    if (number !== undefined) return Number(number)
    if (name !== undefined)
      return name.replace(/#([0-9a-fA-F]{2})/g, (_, hex: string) => String.fromCharCode(parseInt(hex, 16)))
    if (word !== undefined)
      return word === 'true' ? true : word === 'false' ? false : word === 'null' ? null : { operator: word }
    return this.bracketed(bracket ?? '')
  }

  private bracketed(bracket: string): Value {
    if (bracket === '<') return this.hex()
    if (bracket === '(') return this.literal()
    if (bracket === '[') return this.until(']')
    if (bracket === '<<') {
      const flat = this.until('>>')
      return new Map(flat.flatMap((key, i) => (i % 2 === 0 ? [[String(key), flat[i + 1] ?? null] as const] : [])))
    }
    return { operator: bracket }
  }

  private until(close: string): Value[] {
    const values: Value[] = []
    for (let value = this.next(); value !== undefined; value = this.next()) {
      if (isOperator(value) && value.operator === close) return values
      values.push(value)
    }
    throw new Error(`No ${close} in the PDF`)
  }

  private hex(): Bytes {
    const end = this.text.indexOf('>', this.at)
    const digits = this.text.slice(this.at, end).replace(/\s/g, '')
    this.at = end + 1
    return { bytes: Buffer.from(digits.length % 2 ? `${digits}0` : digits, 'hex').toString('latin1') }
  }

  private literal(): Bytes {
    const escapes: Record<string, string> = { n: '\n', r: '\r', t: '\t', b: '\b', f: '\f' }
    let bytes = ''
    for (let depth = 1; ; this.at++) {
      const sign = this.text.charAt(this.at)
      if (sign === '') throw new Error('A string of the PDF does not end')
      if (sign === '\\') {
        const octal = /^[0-7]{1,3}/.exec(this.text.slice(this.at + 1, this.at + 4))?.[0]
        const next = this.text.charAt(this.at + 1)
        bytes += octal ? String.fromCharCode(parseInt(octal, 8)) : (escapes[next] ?? next)
        this.at += octal ? octal.length : 1
        continue
      }
      depth += sign === '(' ? 1 : sign === ')' ? -1 : 0
      if (depth === 0) break
      bytes += sign
    }
    this.at++
    return { bytes }
  }
}

/** The objects of a PDF by their number. Object streams, which our own writer does not use, are not read. */
export class Objects {
  private readonly values = new Map<number, Value>()
  private readonly streams = new Map<number, { at: number; dict: Dict }>()

  constructor(private readonly text: string) {
    for (const found of text.matchAll(/(?:^|[\r\n])(\d+) \d+ obj\b/g)) {
      const scanner = new Scanner(text, found.index + found[0].length)
      const value = scanner.next()
      if (value === undefined) continue
      this.values.set(Number(found[1]), value)
      const stream = /^\s*stream\r?\n/.exec(text.slice(scanner.at, scanner.at + 20))
      if (stream && isDict(value))
        this.streams.set(Number(found[1]), { at: scanner.at + stream[0].length, dict: value })
    }
  }

  all(): Value[] {
    return [...this.values.values()]
  }

  /** What a value says, its references followed. */
  get(value: Value | undefined): Value | undefined {
    return isRef(value) ? this.get(this.values.get(value.ref)) : value
  }

  dict(value: Value | undefined): Dict {
    const found = this.get(value)
    if (!isDict(found)) throw new Error('No dictionary where the PDF should have one')
    return found
  }

  numbers(value: Value | undefined): number[] {
    const found = this.get(value)
    return Array.isArray(found) ? found.map((each) => Number(this.get(each))) : []
  }

  /** The bytes of a stream, unpacked. */
  stream(value: Value | undefined): Buffer {
    const found = isRef(value) ? this.streams.get(value.ref) : undefined
    if (!found) throw new Error('No stream where the PDF should have one')
    const length = Number(this.get(found.dict.get('/Length')))
    const bytes = Buffer.from(this.text.slice(found.at, found.at + length), 'latin1')
    const filter = this.get(found.dict.get('/Filter'))
    return filter === undefined ? bytes : inflateSync(bytes)
  }
}
