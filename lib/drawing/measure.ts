import { fractionShare, textSizes, wordShare } from './inks'
import metrics from './metrics.json'
import type { PlacedRun } from './plate'
import type { LabelSize } from './kinds'
import type { Line, RichText, Run } from './text'

/** A label laid out: its runs in place, and the room it takes. Px. */
export interface LaidText {
  runs: PlacedRun[]
  width: number
  /** Above and below the first baseline. */
  ascent: number
  descent: number
}

type Align = 'start' | 'middle' | 'end'

const capHeight = 0.7
const lineHeight = 1.12
const footMarkShare = 0.55
const wordAdvances: Readonly<Record<string, number>> = metrics.word

/** A letter that the table lacks is given the widest room, so that it can crowd nothing. */
const widest = Math.max(...Object.values(wordAdvances))

/** Width of a text in thousandths of its size, from the fonts' own advances (scripts/font-metrics.ts). */
export function advance(face: 'mono' | 'word', text: string): number {
  if (face === 'mono') return metrics.mono * text.length
  return [...text].reduce((total, letter) => total + (wordAdvances[letter] ?? widest), 0)
}

/** Lays a label out at a size class, its lines set to one side or centred. */
export function layText(text: RichText, size: LabelSize, scale: number, align: Align = 'start'): LaidText {
  const px = textSizes[size] * scale
  const lines = text.map((line) => layLine(line, px))
  const width = Math.max(...lines.map((line) => line.width))
  const shift = { start: 0, middle: 0.5, end: 1 }[align]
  const runs = lines.flatMap((line, row) =>
    line.runs.map((run) => ({ ...run, x: run.x + (width - line.width) * shift, y: run.y + row * px * lineHeight })),
  )
  const last = text[text.length - 1] ?? []
  const descent = (text.length - 1) * px * lineHeight + px * (hangs(last) ? 0.2 : 0.03)
  return { runs, width, ascent: px * capHeight, descent }
}

function layLine(line: Line, px: number): { runs: PlacedRun[]; width: number } {
  const runs: PlacedRun[] = []
  let x = 0
  for (const run of line) {
    const laid = layRun(run, x, px)
    runs.push(...laid.runs)
    x = laid.end
  }
  return { runs, width: x }
}

function layRun(run: Run, x: number, px: number): { runs: PlacedRun[]; end: number } {
  const ink = run.ink ?? 'text'
  if (run.kind === 'fraction') return layFraction(run.over, run.under, x, px, ink)
  if (run.kind === 'shape') {
    const width = px * (run.shape.startsWith('arrow') ? 1.5 : 0.66)
    return { runs: [{ kind: 'shape', shape: run.shape, x, y: 0, size: px, width, ink }], end: x + width }
  }
  const face = run.kind === 'number' ? 'mono' : 'word'
  // Primes are set at the size of the number they belong to.
  const size = face === 'word' && !/^[′″]$/.test(run.text) ? px * wordShare : px
  const width = (advance(face, run.text) * size) / 1000
  // The foot mark's own advance leaves a hole before the inches.
  const end = x + width * (run.text === '′' ? footMarkShare : 1)
  return { runs: [{ kind: 'text', face, text: run.text, x, y: 0, size, width: end - x, ink }], end }
}

/** Raised numerator, slash, denominator on the line: one fraction, as high as the figures beside it. */
function layFraction(over: number, under: number, x: number, px: number, ink: PlacedRun['ink']) {
  const size = px * fractionShare
  const figure = (text: string, from: number, y: number): PlacedRun => ({
    kind: 'text',
    face: 'mono',
    text,
    x: from,
    y,
    size,
    width: (advance('mono', text) * size) / 1000,
    ink,
  })
  const top = figure(String(over), x + px * 0.05, -px * (0.668 - 0.668 * fractionShare))
  const slashWidth = (advance('word', '⁄') * px) / 1000
  const slash: PlacedRun = {
    kind: 'text',
    face: 'word',
    text: '⁄',
    x: top.x + top.width - px * 0.02,
    y: 0,
    size: px,
    width: slashWidth,
    ink,
  }
  const bottom = figure(String(under), slash.x + slashWidth - px * 0.02, 0)
  return { runs: [top, slash, bottom], end: bottom.x + bottom.width + px * 0.02 }
}

/** True when a letter of the line reaches below it. */
function hangs(line: Line): boolean {
  return line.some((run) => (run.kind === 'word' || run.kind === 'number') && /[gjpqyQ,;()]/.test(run.text))
}
