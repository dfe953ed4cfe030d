import type { Cell, Column, SheetReading, Table } from '@/lib/print/sheet/sheet'
import { Pieces } from './pieces'

/** A table as it is printed; on a phone each row is a card. */
export function SheetTable({ table, reading }: { table: Table; reading: SheetReading }) {
  const { columns, rows, key, title } = table
  const whole = columns.reduce((sum, { share }) => sum + share, 0)
  return (
    <section aria-label={title}>
      <table role="table" className="printed-table">
        <colgroup>
          {columns.map(({ head, share }) => (
            <col key={head} style={{ width: `${((share / whole) * 100).toFixed(2)}%` }} />
          ))}
        </colgroup>
        <thead role="rowgroup">
          <tr role="row">
            {columns.map(({ head, under }) => (
              <th key={head} role="columnheader" scope="col">
                {head}
                {under && <small> {under}</small>}
              </th>
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup">
          {rows.map((cells, i) => (
            <tr key={i} role="row">
              {columns.map((column, at) => (
                <SheetCell key={column.head} column={column} cell={cells[at] ?? { line: [] }} reading={reading} />
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      {key && (
        <p className="printed-key">
          <Pieces line={key} reading={reading} />
        </p>
      )}
    </section>
  )
}

function SheetCell({ column, cell, reading }: { column: Column; cell: Cell; reading: SheetReading }) {
  const inside = (
    <>
      {cell.box && <span className="printed-box" role="img" aria-label="box to tick" />}
      <span className="printed-line">
        <Pieces line={cell.line} reading={reading} />
      </span>
      {cell.under && (
        <small>
          <Pieces line={cell.under} reading={reading} />
        </small>
      )}
    </>
  )
  return column.as === 'mark' ? (
    <th role="rowheader" scope="row" data-as={column.as}>
      {inside}
    </th>
  ) : (
    <td role="cell" data-as={column.as} data-head={[column.head, column.under].filter(Boolean).join(', ')}>
      {inside}
    </td>
  )
}
