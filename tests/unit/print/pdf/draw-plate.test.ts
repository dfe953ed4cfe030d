import PDFDocument from 'pdfkit'
import { describe, expect, it } from 'vitest'
import { draw } from '@/components/drawing/pitch'
import { compose } from '@/lib/drawing/compose'
import { drawPlate } from '@/lib/print/pdf/draw-plate'
import { registerFaces } from '@/lib/print/pdf/faces'
import { pitchFrom } from '@/lib/trade/pitch'
import { isRefusal } from '@/lib/trade/refusal'

async function sheet(): Promise<string> {
  const solved = pitchFrom({ rise: 7, run: 11 })
  if (isRefusal(solved)) throw new Error('refused')
  const plate = compose(draw({}, solved, { tape: 16, dial: 0.25, detail: 'full' }), {
    width: 700,
    height: 400,
    textScale: 0.75,
    lineScale: 0.7,
  })
  const doc = new PDFDocument({ compress: false })
  const chunks: Buffer[] = []
  doc.on('data', (chunk: Buffer) => chunks.push(chunk))
  const ended = new Promise((resolve) => doc.on('end', resolve))
  registerFaces(doc)
  drawPlate(doc, plate, { x: 36, y: 36, pointsPerPx: 0.75 })
  doc.end()
  await ended
  return Buffer.concat(chunks).toString('latin1')
}

describe('drawPlate', () => {
  it('embeds both faces with outlines in them', async () => {
    const pdf = await sheet()
    expect(pdf).toMatch(/AtkinsonHyperlegibleMono/)
    expect(pdf).toMatch(/BarlowCondensed/)
    // An empty glyph table, which WOFF2 files end in, is a few hundred bytes.
    const lengths = [...pdf.matchAll(/\/Length1? (\d+)/g)].map(([, length]) => Number(length))
    expect(lengths.filter((length) => length > 1500).length).toBeGreaterThanOrEqual(2)
  })

  it('leaves every state it saved', async () => {
    const pdf = await sheet()
    const count = (operator: string) => pdf.match(new RegExp(`^${operator}$`, 'gm'))?.length ?? 0
    expect(count('q')).toBeGreaterThan(0)
    expect(count('q')).toBe(count('Q'))
  })
})
