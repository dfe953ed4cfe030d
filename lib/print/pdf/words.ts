import { textSizes } from '@/lib/drawing/inks'
import { layText } from '@/lib/drawing/measure'
import { dial, length, plain, shape, type Line as Label } from '@/lib/drawing/text'
import { showMetric } from '@/lib/trade/quantity/metric'
import { showTape } from '@/lib/trade/quantity/tape'
import type { Line, Piece, SheetReading } from '../sheet/sheet'
import { tidy, type Face, type Pdf } from './faces'
import { widthOf, type Run } from './write'

interface Letters {
  face: Face
  size: number
}
/** How a line is set: its words, what stands out, and the size of its lengths and angles, points. */
export interface Style {
  plain: Letters
  strong: Letters
  number: number
}

/** What is never parted: runs with their places from its own left end. */
export interface Atom {
  runs: readonly Run[]
  width: number
  /** What a number says in plain characters, for whoever copies it or hears it. */
  says?: string
}
/** Atoms that touch, and the room before them where they do not begin a row. */
export interface Word {
  atoms: readonly Atom[]
  width: number
  space: number
}

export const sizeOf = ({ plain: words, strong, number }: Style, line: Line): number =>
  Math.max(
    words.size,
    ...line.map((piece) => (typeof piece === 'string' ? 0 : 'strong' in piece ? strong.size : number)),
  )

/** A no-break space parts nothing. */
const gaps = /[^\S\u00a0\u202f]+|[\S\u00a0\u202f]+/gu
const isGap = /^[^\S\u00a0\u202f]/u

/** A line's words, measured. Blanks between pieces part them; pieces that touch stay together. */
export function wordsOf(doc: Pdf, line: Line, style: Style, reading: SheetReading): Word[] {
  const words: Word[] = []
  let space = 0
  let open = false
  const add = (atom: Atom) => {
    const last = words.at(-1)
    if (open && last)
      words[words.length - 1] = { ...last, atoms: [...last.atoms, atom], width: last.width + atom.width }
    else words.push({ atoms: [atom], width: atom.width, space })
    open = true
    space = 0
  }
  const blank = (letters: Letters, count: number) => {
    space += widthOf(doc, letters.face, letters.size, ' ') * count
    open = false
  }
  for (const piece of line) {
    if (typeof piece === 'string' || 'strong' in piece) {
      const [text, letters] = typeof piece === 'string' ? [piece, style.plain] : [piece.strong, style.strong]
      for (const [bit] of text.matchAll(gaps)) {
        if (isGap.test(bit)) blank(letters, bit.length)
        else add(textAtom(doc, bit, letters))
      }
    } else numberAtoms(doc, piece, style, reading).forEach((atom, i) => (i > 0 && blank(style.plain, 1), add(atom)))
  }
  return words
}

/** Width of a stroke of a blank as a part of its size. */
export const blankShare = 0.56

/** Three strokes and more are a blank to write on. */
function textAtom(doc: Pdf, text: string, { face, size }: Letters): Atom {
  const isBlank = /^_{3,}$/.test(text)
  const width = isBlank ? text.length * size * blankShare : widthOf(doc, face, size, text)
  const at = { x: 0, y: 0, size, width }
  return { runs: [isBlank ? { kind: 'rule', ...at } : { kind: 'text', face, text: tidy(text), ...at }], width }
}

type Number = Exclude<Piece, string | { strong: string }>

/** Lengths in inches as fractions; in millimetres first, the tape small beside, where the reader asks for them. */
function numberAtoms(
  doc: Pdf,
  piece: Number,
  { plain: { size }, number }: Style,
  { precision, preferences }: SheetReading,
): Atom[] {
  const show = { ...precision, metric: preferences.units === 'mm', detail: 'full' as const }
  if ('face' in piece) return [laid([shape(piece.face === 'top' ? 'triangle-down' : 'triangle-up')], size * 1.2)]
  if ('dial' in piece) return [laid(dial(piece.dial, show), number)]
  const first = laid(length(piece.tape, show), number)
  return show.metric
    ? [first, textAtom(doc, showTape(piece.tape, precision.tape), { face: 'text', size: size * 0.88 })]
    : [first]
}

function laid(label: Label, size: number): Atom {
  const { runs, width } = layText([label], 'number', size / textSizes.number)
  return { runs, width, says: plain([label]) }
}

/** A length in the reader's first unit, and in the other. */
export const bothUnits = (inches: number, { precision }: SheetReading) => ({
  metric: showMetric(inches),
  tape: showTape(inches, precision.tape),
})
