import type { Outputs } from '@/lib/calculators/outputs'
import type { Compared } from '@/lib/proof/rows'
import { ProofTable } from './proof-table'

/** Published values beside ours, gathered by the print they come from. */
export function Proof({ rows, outputs }: { rows: readonly Compared[]; outputs: Outputs }) {
  return (
    <section aria-labelledby="proof">
      <h2 id="proof">The proof</h2>
      {rows.length === 0 ? (
        <p>No published value was found for this one yet. It rests on its working and its tests.</p>
      ) : (
        <>
          <p className="mb-3">{countText(rows)}</p>
          {byPrint(rows).map(([print, of]) => (
            <details key={print} className="more">
              <summary>
                {print} ({of.length})
              </summary>
              <ProofTable rows={of} outputs={outputs} title={print} />
            </details>
          ))}
        </>
      )}
    </section>
  )
}

/** Values that are computed, and those looked up in the table that was copied, counted apart: only the first prove anything. */
function countText(rows: readonly Compared[]): string {
  const computed = rows.filter(({ row }) => row.kind === 'computed')
  const agreeing = computed.filter(({ agrees }) => agrees).length
  const copied = rows.length - computed.length
  const agreement = agreeing === computed.length ? 'all agree' : `${agreeing} agree`
  const told = `${computed.length} published values that it computes: ${agreement} within what their print rounds to.`
  return copied === 0
    ? told
    : `${told} ${copied} more are looked up in a table that it copies, and prove the copying only.`
}

function byPrint(rows: readonly Compared[]): [string, Compared[]][] {
  const prints = new Map<string, Compared[]>()
  for (const compared of rows) prints.set(compared.row.source, [...(prints.get(compared.row.source) ?? []), compared])
  return [...prints]
}
