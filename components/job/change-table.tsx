import type { Precision } from '@/lib/calculators/fields'
import './change-table.css'
import { readsAs, type Change, type Leaf } from './compare'

function difference({ before, after }: Change): string {
  if (typeof before?.value !== 'number' || typeof after?.value !== 'number') return ''
  const by = after.value - before.value
  return `${by > 0 ? '+' : '−'}${Math.abs(by).toFixed(3)}`
}

const text = (leaf: Leaf | undefined, precision: Precision) => (leaf ? readsAs(leaf, precision) : '–')

/** What two revisions say differently, old beside new. */
export function ChangeTable({
  changes,
  precision,
  caption,
}: {
  changes: readonly Change[]
  precision: Precision
  caption: string
}) {
  if (changes.length === 0) return <p>Nothing differs.</p>
  return (
    <table role="table" className="change-table">
      <caption className="sr-only">{caption}</caption>
      <thead role="rowgroup">
        <tr role="row">
          {['What', 'Was', 'Is', 'By'].map((head) => (
            <th key={head} role="columnheader" scope="col">
              {head}
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup">
        {changes.map((change) => (
          <tr key={change.path} role="row">
            <th role="rowheader" scope="row">
              {change.label}
            </th>
            <td role="cell" data-head="was">
              {text(change.before, precision)}
            </td>
            <td role="cell" data-head="is">
              {text(change.after, precision)}
            </td>
            <td role="cell">{difference(change)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  )
}
