import { writeFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import PDFDocument from 'pdfkit'

/** Writes lib/drawing/metrics.json: advances of the drawing's two faces, in thousandths of the text size. */
const fonts = {
  mono: 'atkinson-hyperlegible-mono-latin-wght-normal.woff2',
  word: 'barlow-condensed-latin-600-normal.woff2',
}

// Printable ASCII, and what trade labels add to it: degree, dash, minus, times, fraction slash, middle dot, primes, quotes.
const letters = [...Array(95).keys()].map((i) => String.fromCharCode(32 + i)).concat([...'°–−×⁄·′″’“”'])

function advances(file: string): Record<string, number> {
  const doc = new PDFDocument()
  doc.font(fileURLToPath(new URL(`../fonts/${file}`, import.meta.url))).fontSize(1000)
  return Object.fromEntries(letters.map((letter) => [letter, Math.round(doc.widthOfString(letter))]))
}

const mono = advances(fonts.mono)
const metrics = { mono: mono['0'], word: advances(fonts.word) }
writeFileSync(new URL('../lib/drawing/metrics.json', import.meta.url), `${JSON.stringify(metrics)}\n`)
