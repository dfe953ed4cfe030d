import { readFileSync } from 'node:fs'
import path from 'node:path'

export type Pdf = PDFKit.PDFDocument

/** WOFF of one weight each: from WOFF2 pdfkit embeds empty glyphs, and it cannot pick a weight of a variable file. */
const files = {
  text: 'atkinson-hyperlegible-next-latin-400-normal.woff',
  bold: 'atkinson-hyperlegible-next-latin-700-normal.woff',
  mono: 'atkinson-hyperlegible-mono-latin-600-normal.woff',
  word: 'barlow-condensed-latin-600-normal.woff',
  'text extended': 'atkinson-hyperlegible-next-latin-ext-400-normal.woff',
  'bold extended': 'atkinson-hyperlegible-next-latin-ext-700-normal.woff',
  'word extended': 'barlow-condensed-latin-ext-600-normal.woff',
  'word vietnamese': 'barlow-condensed-vietnamese-600-normal.woff',
} as const

type File = keyof typeof files
/** Words to read, words that stand out, numbers, and heads. */
export type Face = 'text' | 'bold' | 'mono' | 'word'

/** Where a letter is looked for, best first. */
const spares: Readonly<Record<Face, readonly File[]>> = {
  text: ['text', 'text extended', 'word', 'word extended', 'word vietnamese'],
  bold: ['bold', 'bold extended', 'word', 'word extended', 'word vietnamese'],
  mono: ['mono', 'bold', 'bold extended', 'word', 'word extended', 'word vietnamese'],
  word: ['word', 'word extended', 'word vietnamese', 'bold', 'bold extended'],
}

const sources = new Map<File, Buffer>()
const letters = new Map<File, ReadonlySet<number>>()

function sourceOf(file: File): Buffer {
  const kept = sources.get(file)
  if (kept) return kept
  const source = readFileSync(path.join(process.cwd(), 'fonts', 'print', files[file]))
  sources.set(file, source)
  return source
}

/** Makes our faces known to a document; once a document, before anything is written or measured. */
export function registerFaces(doc: Pdf): void {
  for (const file of Object.keys(files) as File[]) doc.registerFont(file, sourceOf(file))
}

/** What pdfkit holds of an open font; its types leave it out. */
type OpenFont = { _font: { font: { characterSet: readonly number[]; capHeight: number; unitsPerEm: number } } }
const openFont = (doc: Pdf, file: File) => (doc.font(file) as unknown as OpenFont)._font.font

function lettersOf(doc: Pdf, file: File): ReadonlySet<number> {
  const kept = letters.get(file)
  if (kept) return kept
  const set = new Set(openFont(doc, file).characterSet)
  letters.set(file, set)
  return set
}

/** Height of a face's capitals as a part of its size. */
export function capShare(doc: Pdf, face: Face): number {
  const { capHeight, unitsPerEm } = openFont(doc, face)
  return capHeight / unitsPerEm
}

export interface Stretch {
  file: File
  text: string
}

const graphemes = new Intl.Segmenter('en', { granularity: 'grapheme' })
/** What has no shape of its own: joiners, direction marks, variation selectors, controls. */
const shapeless = /[\p{Default_Ignorable_Code_Point}\p{Cf}\p{Cc}]/gu
/** The same without what holds one picture together, which makes one letter of several signs. */
const loose = /(?![\u200d\ufe0f])[\p{Default_Ignorable_Code_Point}\p{Cf}\p{Cc}]/gu

/** A text as it can be written: composed, on one line, without what has no shape. */
export const tidy = (text: string): string => text.normalize('NFC').replace(/\s+/gu, ' ').replace(loose, '')

/** A text's letters, one by one as a reader counts them. */
export const lettersIn = (text: string): string[] => Array.from(graphemes.segment(text), ({ segment }) => segment)

/** Splits a text by the font that has its letters; a letter that none of them has becomes a question mark. */
export function stretchesOf(doc: Pdf, face: Face, text: string): Stretch[] {
  const has = (file: File, letter: string) => {
    const set = lettersOf(doc, file)
    return [...letter].every((sign) => set.has(sign.codePointAt(0) ?? 0))
  }
  if (has(face, text)) return text === '' ? [] : [{ file: face, text }]
  const stretches: Stretch[] = []
  for (const whole of lettersIn(text)) {
    const letter = whole.replace(shapeless, '')
    if (letter === '') continue
    const file = spares[face].find((spare) => has(spare, letter))
    const last = stretches.at(-1)
    const next = file ? { file, text: letter } : { file: face, text: '?' }
    if (last?.file === next.file) last.text += next.text
    else stretches.push(next)
  }
  return stretches
}
