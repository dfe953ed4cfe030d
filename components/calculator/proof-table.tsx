import { defaultPrecision } from '@/lib/calculators/fields'
import type { Output, Outputs } from '@/lib/calculators/outputs'
import { valueText } from '@/lib/calculators/text'
import { outputAt } from '@/lib/proof/path'
import type { Compared } from '@/lib/proof/rows'

/** Unrounded but for what doubles leave behind: a proof compares numbers, not tapes. */
function plainText(value: number | string | boolean, output: Output | undefined): string {
  const plain = typeof value === 'number' ? Number(value.toFixed(4)) : value
  return output?.kind === 'value' ? valueText({ ...output, round: 'exact' }, plain, defaultPrecision) : String(plain)
}

/** One print's values: printed, ours, the difference, and where they stand. */
export function ProofTable({ rows, outputs, title }: { rows: readonly Compared[]; outputs: Outputs; title: string }) {
  return (
    <>
      {[...new Set(rows.map(({ row }) => `${row.where}: ${row.provenance}.`))].map((from) => (
        <p key={from} className="mb-2 text-mute">
          {from}
        </p>
      ))}
      <div className="table-scroll" tabIndex={0} role="region" aria-label={title}>
        <table className="proof">
          <thead>
            <tr>
              <th scope="col">Value</th>
              <th scope="col">Printed</th>
              <th scope="col">Ours</th>
              <th scope="col">Off by</th>
            </tr>
          </thead>
          <tbody>
            {rows.map((compared) => (
              <Row key={compared.row.id} {...compared} output={outputAt(outputs, compared.row.output)} />
            ))}
          </tbody>
        </table>
      </div>
    </>
  )
}

function Row({ row, computed, difference, agrees, output }: Compared & { output: Output | undefined }) {
  return (
    <tr>
      <td>
        {row.quantity}
        {row.note && <small className="block text-mute">{row.note}</small>}
      </td>
      <td>{row.asPrinted ?? plainText(row.printed, output)}</td>
      <td>{plainText(computed, output)}</td>
      <td>
        {difference === null
          ? agrees
            ? 'the same'
            : 'another'
          : `${difference > 0 ? '+' : ''}${plainText(difference, output)}`}
        {!agrees && <b className="block text-off">{row.printIsWrong ?? 'outside its rounding'}</b>}
      </td>
    </tr>
  )
}
