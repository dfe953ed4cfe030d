import type { Line, SheetReading } from '../sheet/sheet'
import { lettersIn, type Pdf } from './faces'
import { sizeOf, wordsOf, type Atom, type Style, type Word } from './words'
import { widthOf, writeRun } from './write'

/** Something measured, ready to be drawn from its upper left corner. Points. */
export interface Part {
  height: number
  draw: (x: number, y: number) => void
}
/** A line set in rows. */
export interface Setting extends Part {
  /** Of the widest row. */
  width: number
  rows: number
  /** Of the first row, from the upper edge. */
  baseline: number
  /** True where rows were left out. */
  cut: boolean
}
export interface Setup {
  doc: Pdf
  reading: SheetReading
}
interface Measure {
  width: number
  align?: 'left' | 'centre' | 'right'
  /** Rows at most; what is left over ends in an ellipsis. */
  most?: number
  colour?: string
}

const leading = 1.22
/** Where the baseline lies in its row, so that capitals stand in its middle. */
const baseline = 0.95

interface Row {
  words: Word[]
  width: number
}

/** Sets a line to a width: words wrap, a word that is wider is parted between letters. */
export function setLine({ doc, reading }: Setup, line: Line, style: Style, measure: Measure): Setting {
  const { width, align = 'left', most = Infinity, colour } = measure
  const size = sizeOf(style, line)
  const all = wrap(doc, wordsOf(doc, line, style, reading), width)
  const cut = all.length > most
  const rows = cut ? ended(doc, all.slice(0, most), style, width) : all
  const shift = { left: 0, centre: 0.5, right: 1 }[align]
  return {
    width: Math.max(0, ...rows.map((row) => row.width)),
    height: rows.length * size * leading,
    rows: rows.length,
    baseline: size * baseline,
    cut,
    draw: (x, y) =>
      rows.forEach((row, i) =>
        drawRow(doc, row, x + (width - row.width) * shift, y + size * (i * leading + baseline), colour),
      ),
  }
}

/** Width of a line on one row. */
export const lineWidth = ({ doc, reading }: Setup, line: Line, style: Style): number =>
  rowOf(wordsOf(doc, line, style, reading)).width

function rowOf(words: Word[]): Row {
  return { words, width: words.reduce((sum, word, i) => sum + word.width + (i > 0 ? word.space : 0), 0) }
}

/** A hair that rounding may add to a line which fits exactly. */
const hair = 0.01

function wrap(doc: Pdf, words: readonly Word[], width: number): Row[] {
  const rows: Row[] = []
  let row: Word[] = []
  for (const word of words.flatMap((each) => (each.width > width + hair ? parted(doc, each, width) : [each]))) {
    if (row.length > 0 && rowOf([...row, word]).width > width + hair) {
      rows.push(rowOf(row))
      row = []
    }
    row.push(word)
  }
  return row.length > 0 ? [...rows, rowOf(row)] : rows
}

/** Parts a word that is too wide, first between its atoms, then between letters. */
function parted(doc: Pdf, { atoms, space }: Word, width: number): Word[] {
  const bits = atoms.flatMap((atom) => (atom.width > width + hair ? lettersOf(doc, shortRule(atom, width)) : [atom]))
  const words: Word[] = []
  for (const atom of bits) {
    const last = words.at(-1)
    if (last && last.width + atom.width <= width)
      words[words.length - 1] = { ...last, atoms: [...last.atoms, atom], width: last.width + atom.width }
    else words.push({ atoms: [atom], width: atom.width, space: last ? 0 : space })
  }
  return words
}

/** A blank to write on is no wider than its place. */
function shortRule(atom: Atom, width: number): Atom {
  const [run] = atom.runs
  return run?.kind === 'rule' ? { runs: [{ ...run, width }], width } : atom
}

function lettersOf(doc: Pdf, atom: Atom): Atom[] {
  const [run] = atom.runs
  if (atom.runs.length !== 1 || run?.kind !== 'text') return [atom]
  return lettersIn(run.text).map((text) => {
    const width = widthOf(doc, run.face, run.size, text)
    return { runs: [{ ...run, text, width }], width }
  })
}

/** Ends the last row in an ellipsis, taking off it what leaves no room for that. */
function ended(doc: Pdf, rows: Row[], { plain: { face, size } }: Style, width: number): Row[] {
  const dots = widthOf(doc, face, size, '…')
  const atom: Atom = { runs: [{ kind: 'text', face, text: '…', x: 0, y: 0, size, width: dots }], width: dots }
  const words = [...(rows.at(-1)?.words ?? [])]
  while (words.length > 1 && rowOf(words).width + dots > width) words.pop()
  const last = words.pop()
  const kept = last ? shortened(doc, last, width - rowOf(words).width - dots - last.space) : []
  const word: Word = {
    atoms: [...kept, atom],
    width: kept.reduce((sum, each) => sum + each.width, dots),
    space: last?.space ?? 0,
  }
  return [...rows.slice(0, -1), rowOf([...words, word])]
}

function shortened(doc: Pdf, { atoms, width: whole }: Word, width: number): readonly Atom[] {
  if (whole <= width) return atoms
  const letters = atoms.flatMap((atom) => lettersOf(doc, atom))
  while (letters.length > 0 && letters.reduce((sum, atom) => sum + atom.width, 0) > width) letters.pop()
  return letters
}

/** Words are written with the blank after them, so that it is there for whoever searches or copies the text. */
function drawRow(doc: Pdf, { words }: Row, x: number, y: number, colour?: string): void {
  let at = x
  words.forEach(({ atoms, space }, i) => {
    at += i > 0 ? space : 0
    atoms.forEach(({ runs, width, says }, n) => {
      const after = n === atoms.length - 1 && (words[i + 1]?.space ?? 0) > 0 ? ' ' : ''
      if (says) doc.markContent('Span', { actual: says + after })
      runs.forEach((run, r) => {
        const placed = { ...run, x: at + run.x, y: y + run.y }
        const isEnd = r === runs.length - 1 && !says
        writeRun(doc, placed.kind === 'text' && isEnd ? { ...placed, text: placed.text + after } : placed, colour)
      })
      if (says) doc.endMarkedContent()
      at += width
    })
  })
}
