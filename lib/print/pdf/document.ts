import PDFDocument from 'pdfkit'
import type { Paper } from '@/lib/schemas/sheet'
import { registerFaces, type Pdf } from './faces'

/** Points: 72 an inch. */
const sizes: Readonly<Record<Paper, readonly [width: number, height: number]>> = {
  letter: [612, 792],
  a4: [595.28, 841.89],
}

/** White round the sheet, which every printer leaves. */
const margin = 36

/** Where a page may be drawn on, points from its upper left corner, y down. */
export interface Ground {
  paper: readonly [width: number, height: number]
  left: number
  top: number
  width: number
  bottom: number
}

export function groundOf(paper: Paper): Ground {
  const [width, height] = sizes[paper]
  return { paper: [width, height], left: margin, top: margin, width: width - 2 * margin, bottom: height - margin }
}

/** The file's own day, which a PDF cannot do without: a fixed one, so that the same sheet gives the same bytes. */
const day = new Date(0)

/** A document without pages yet. */
export function openDocument(title: string, subject: string): Pdf {
  const info = {
    Title: title,
    Subject: subject,
    Producer: 'Longpoint',
    Creator: 'Longpoint',
    CreationDate: day,
  }
  const doc = new PDFDocument({
    autoFirstPage: false,
    compress: true,
    pdfVersion: '1.7',
    lang: 'en',
    displayTitle: true,
    info,
  })
  registerFaces(doc)
  return doc
}

/** Ends a document and hands over its bytes. */
export function bytesOf(doc: Pdf): Promise<Buffer> {
  return new Promise((resolve, reject) => {
    const chunks: Buffer[] = []
    doc.on('data', (chunk: Buffer) => chunks.push(chunk))
    doc.on('end', () => resolve(Buffer.concat(chunks)))
    doc.on('error', reject)
    doc.end()
  })
}
