import type { Block, Sheet, SheetReading } from '@/lib/print/sheet/sheet'
import { PaperPlate } from './paper-plate'
import { Pieces } from './pieces'
import { SheetFoot } from './sheet-foot'
import { SheetLists } from './sheet-lists'
import { SheetTable } from './sheet-table'
import './sheet.css'

/** A sheet as it leaves the printer: black on white in every theme, one page; on a phone it reads down. */
export function SheetPaper({ sheet }: { sheet: Sheet }) {
  const { supersededBy, facts, blocks, reading } = sheet
  const rows = blocks.reduce((sum, block) => sum + (block.kind === 'table' ? block.rows.length : 0), 0)
  return (
    <article className="printed" aria-label="Sheet" data-superseded={supersededBy ?? undefined}>
      {supersededBy !== undefined && (
        <>
          <p className="printed-superseded">
            Superseded: revision {supersededBy} stands in its place. Do not cut from this sheet.
          </p>
          <span className="printed-over" aria-hidden="true">
            superseded
          </span>
        </>
      )}
      <SheetTop sheet={sheet} />
      <ul className="printed-facts">
        {facts.map((line, i) => (
          <li key={i}>
            <Pieces line={line} reading={reading} />
          </li>
        ))}
      </ul>
      {blocks.map((block, i) => (
        <SheetBlock key={i} block={block} reading={reading} rows={rows} />
      ))}
      <SheetFoot sheet={sheet} />
    </article>
  )
}

function SheetTop({ sheet: { title, under, particulars, hand, reading } }: { sheet: Sheet }) {
  return (
    <header className="printed-head">
      <div className="printed-title">
        <h2>{title}</h2>
        <p>{under}</p>
      </div>
      <div className="printed-particulars">
        {particulars.map((line, i) => (
          <p key={i}>
            <Pieces line={line} reading={reading} />
          </p>
        ))}
      </div>
      {hand && (
        <p className="printed-hand">
          <b>{hand}</b>
          <span>
            hand, going UP <i aria-hidden="true" className="printed-up" />
          </span>
        </p>
      )}
    </header>
  )
}

/** The picture gives way to long tables, so that the whole stays on one page. */
const pictureHeight = (rows: number) => Math.max(190, 400 - 34 * Math.max(0, rows - 4))

function SheetBlock({ block, reading, rows }: { block: Block; reading: SheetReading; rows: number }) {
  switch (block.kind) {
    case 'picture': {
      const strip = block.as === 'strip'
      const viewport = {
        width: 720,
        height: strip ? 160 : pictureHeight(rows),
        textScale: 0.8,
        lineScale: 0.75,
        margin: 8,
      }
      return (
        <figure className="printed-picture">
          {block.says && <figcaption>{block.says}</figcaption>}
          <PaperPlate sketch={block.sketch} title={block.title} viewport={{ ...viewport, trim: strip }} />
        </figure>
      )
    }
    case 'table':
      return <SheetTable table={block} reading={reading} />
    case 'lists':
      return <SheetLists lists={block.lists} reading={reading} />
    case 'remarks':
      return (
        <ul className="printed-remarks" aria-label="Look at these before cutting">
          {block.lines.map((line, i) => (
            <li key={i}>
              <Pieces line={line} reading={reading} />
            </li>
          ))}
        </ul>
      )
  }
}
