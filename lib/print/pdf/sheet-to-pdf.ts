import type { Paper } from '@/lib/schemas/sheet'
import type { Sheet } from '../sheet/sheet'
import { bytesOf, groundOf, openDocument, type Ground } from './document'
import type { Density } from './density'
import { factsOf } from './facts'
import { footOf } from './foot'
import { headOf, smallHeadOf } from './head'
import { blank, stack } from './flow'
import { pagesOf } from './layout'
import type { Page } from './paginate'
import type { Part, Setup } from './set-line'
import { supersededAcross, supersededBar } from './superseded'

/** Draws a sheet for one paper as a PDF: on one page wherever it can be read on one. The same sheet gives the same bytes. */
export async function sheetToPdf(sheet: Sheet, paper: Paper): Promise<Buffer> {
  const ground = groundOf(paper)
  const doc = openDocument(sheet.title, sheet.under)
  const setup: Setup = { doc, reading: sheet.reading }
  const foot = footOf(setup, sheet, ground.width)
  const height = ground.bottom - ground.top
  const { density, pages } = pagesOf(setup, sheet.blocks, (each) => ({
    width: ground.width,
    first: height - topOf(setup, sheet, ground, each, '').height - foot.height - each.gap,
    further: height - furtherTop(setup, sheet, ground, 'page 2 of 2').height,
  }))
  pages.forEach((page, i) => {
    const says = pages.length > 1 ? `page ${i + 1} of ${pages.length}` : ''
    const top = i === 0 ? topOf(setup, sheet, ground, density, says) : furtherTop(setup, sheet, ground, says)
    drawPage(setup, sheet, ground, { page, top, ...(i === 0 ? { foot } : {}) })
  })
  return bytesOf(doc)
}

function topOf(setup: Setup, sheet: Sheet, { width }: Ground, density: Density, page: string): Part {
  return stack([
    ...barOf(setup, sheet, width),
    headOf(setup, sheet, width, page),
    blank(density.gap * 0.7),
    ...(sheet.facts.length > 0 ? [factsOf(setup, sheet.facts, width, density), blank(density.gap)] : []),
  ])
}

const furtherTop = (setup: Setup, sheet: Sheet, { width }: Ground, page: string): Part =>
  stack([...barOf(setup, sheet, width), smallHeadOf(setup, sheet, width, page), blank(10)])

const barOf = (setup: Setup, { supersededBy }: Sheet, width: number): Part[] =>
  supersededBy === undefined ? [] : [supersededBar(setup, supersededBy, width)]

function drawPage(
  setup: Setup,
  { supersededBy }: Sheet,
  ground: Ground,
  { page, top, foot }: { page: Page; top: Part; foot?: Part },
): void {
  setup.doc.addPage({ size: [...ground.paper], margin: 0 })
  if (supersededBy !== undefined) supersededAcross(setup, supersededBy, ground)
  top.draw(ground.left, ground.top)
  for (const { part, top: at } of page) part.draw(ground.left, ground.top + top.height + at)
  foot?.draw(ground.left, ground.bottom - foot.height)
}
