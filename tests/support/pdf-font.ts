import { isDict, type Dict, type Objects, type Value } from './pdf-syntax'

/** A glyph as the embedded font has it. */
export interface Outline {
  /** False where nothing is drawn: a blank, or what the font lacks. */
  drawn: boolean
  /** Its edges from where it is set, thousandths of the size, up positive. */
  left: number
  bottom: number
  right: number
  top: number
}
const none: Outline = { drawn: false, left: 0, bottom: 0, right: 0, top: 0 }

export interface ReadFont {
  name: string
  textOf: (code: number) => string | undefined
  /** Thousandths of the size. */
  widthOf: (code: number) => number
  outlineOf: (code: number) => Outline
}

/** Reads a font as pdfkit embeds it: two bytes a letter, TrueType outlines. Null for any other. */
export function readFont(objects: Objects, font: Dict): ReadFont | null {
  const descendants = objects.get(font.get('/DescendantFonts'))
  const [first] = Array.isArray(descendants) ? descendants : []
  const descendant = objects.get(first)
  if (!isDict(descendant)) return null
  const descriptor = objects.dict(descendant.get('/FontDescriptor'))
  if (!descriptor.has('/FontFile2')) return null
  const texts = textsOf(objects.stream(font.get('/ToUnicode')).toString('latin1'))
  const widths = widthsOf(objects, descendant.get('/W'))
  const outlines = outlinesOf(objects.stream(descriptor.get('/FontFile2')))
  return {
    name: String(objects.get(descriptor.get('/FontName'))),
    textOf: (code) => texts.get(code),
    widthOf: (code) => widths.get(code) ?? 1000,
    outlineOf: (code) => outlines[code] ?? none,
  }
}

const utf16 = (hex: string) => Buffer.from(hex.replace(/\s/g, ''), 'hex').swap16().toString('utf16le')

/** What the codes say, from ranges with a list: the one form that pdfkit writes. */
function textsOf(map: string): Map<number, string> {
  const texts = new Map<number, string>()
  for (const [, from = '', list = ''] of map.matchAll(/<([0-9a-fA-F]+)> <[0-9a-fA-F]+> \[([^\]]*)\]/g))
    [...list.matchAll(/<([0-9a-fA-F ]+)>/g)].forEach(([, hex = ''], i) => texts.set(parseInt(from, 16) + i, utf16(hex)))
  return texts
}

function widthsOf(objects: Objects, value: Value | undefined): Map<number, number> {
  const widths = new Map<number, number>()
  const entries = objects.get(value)
  if (!Array.isArray(entries)) return widths
  entries.forEach((entry, i) => {
    if (Array.isArray(entry))
      objects.numbers(entry).forEach((width, n) => widths.set(Number(entries[i - 1]) + n, width))
  })
  return widths
}

/** Outlines by glyph, from the tables head, loca and glyf of a TrueType font. */
function outlinesOf(file: Buffer): Outline[] {
  const table = (name: string) => {
    for (let i = 0; i < file.readUInt16BE(4); i++) {
      const at = 12 + i * 16
      const [from, length] = [file.readUInt32BE(at + 8), file.readUInt32BE(at + 12)]
      if (file.toString('latin1', at, at + 4) === name) return file.subarray(from, from + length)
    }
    throw new Error(`The embedded font lacks ${name}`)
  }
  const [head, loca, glyf] = [table('head'), table('loca'), table('glyf')]
  const units = head.readUInt16BE(18)
  const isLong = head.readInt16BE(50) === 1
  const places = isLong
    ? Array.from({ length: loca.length / 4 }, (_, i) => loca.readUInt32BE(i * 4))
    : Array.from({ length: loca.length / 2 }, (_, i) => loca.readUInt16BE(i * 2) * 2)
  return places.slice(0, -1).map((at, i) => {
    if ((places[i + 1] ?? at) <= at || glyf.readInt16BE(at) === 0) return none
    const edge = (n: number) => (glyf.readInt16BE(at + 2 * n) * 1000) / units
    return { drawn: true, left: edge(1), bottom: edge(2), right: edge(3), top: edge(4) }
  })
}

/** A string of the PDF as text: UTF-16 where it begins with its mark, else latin1. */
export const textOf = (bytes: string): string =>
  bytes.startsWith('\xfe\xff') ? utf16(Buffer.from(bytes.slice(2), 'latin1').toString('hex')) : bytes
