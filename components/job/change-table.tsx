import { valueText } from '@/lib/calculators/text'
import type { Precision } from '@/lib/calculators/fields'
import type { Change, Leaf } from './compare'

function text(leaf: Leaf | undefined, precision: Precision): string {
  if (!leaf) return '–'
  if (leaf.shown) return valueText(leaf.shown, leaf.value, precision)
  return typeof leaf.value === 'number' ? String(Number(leaf.value.toFixed(4))) : String(leaf.value)
}

function difference({ before, after }: Change): string {
  if (typeof before?.value !== 'number' || typeof after?.value !== 'number') return ''
  const by = after.value - before.value
  return `${by > 0 ? '+' : '−'}${Math.abs(by).toFixed(3)}`
}

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
    <div className="table-scroll" tabIndex={0} role="region" aria-label={caption}>
      <table className="change-table">
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr>
            <th scope="col">What</th>
            <th scope="col">Was</th>
            <th scope="col">Is</th>
            <th scope="col">By</th>
          </tr>
        </thead>
        <tbody>
          {changes.map((change) => (
            <tr key={change.path}>
              <th scope="row">{change.label}</th>
              <td>{text(change.before, precision)}</td>
              <td>{text(change.after, precision)}</td>
              <td>{difference(change)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}
