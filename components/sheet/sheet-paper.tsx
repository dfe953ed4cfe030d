import { pictureRoom } from '@/lib/print/sheet/picture-room'
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
  const room = pictureRoom(sheet)
  return (
    <article className="printed" aria-label="Sheet" data-superseded={supersededBy ?? undefined}>
      {supersededBy !== undefined && (
        <p className="printed-superseded">
          Superseded: revision {supersededBy} stands in its place. Do not cut from this sheet.
        </p>
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
        <SheetBlock key={i} block={block} reading={reading} room={room} />
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
        {hand && (
          <p className="printed-going">
            hand, going UP <i aria-hidden="true" className="printed-up" />
          </p>
        )}
      </div>
      {hand && <b className="printed-hand">{hand}</b>}
    </header>
  )
}

function SheetBlock({ block, reading, room }: { block: Block; reading: SheetReading; room: number }) {
  switch (block.kind) {
    case 'picture':
      return (
        <figure className="printed-picture">
          {block.says && <figcaption>{block.says}</figcaption>}
          {(block.as === 'strip' ? (['strip'] as const) : ([room, 'desk', 'phone'] as const)).map((on) => (
            <PaperPlate key={on} sketch={block.sketch} title={block.title} on={on} />
          ))}
        </figure>
      )
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
