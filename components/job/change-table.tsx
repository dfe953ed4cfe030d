import type { Precision } from '@/lib/calculators/fields'
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
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label={caption}>
      <table className="w-full max-w-[60rem] border-collapse text-left [&_td]:font-mono [&_td,&_th]:border-b [&_td,&_th]:border-rule [&_td,&_th]:px-2 [&_td,&_th]:py-2 [&_td]:whitespace-nowrap [&_tbody_th]:font-normal">
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
