import type { HandrailOutputs } from '@/lib/trade/rail/types'

/** Filler to buy and time to plan for. */
export function WeldLines({ weld }: { weld: HandrailOutputs['weld'] }) {
  if (!weld) return null
  const rows = [
    ['Weld', `${weld.lengthIn.toFixed(1)} in`],
    ['Filler to buy', `${weld.fillerLb.toFixed(2)} lb`],
    ['In the weld', `${weld.depositedLb.toFixed(2)} lb`],
    ['Arc time', `${weld.arcMinutes.toFixed(1)} min`],
    ['By the clock', `${weld.clockMinutes.toFixed(0)} min`],
  ] as const
  return (
    <section aria-labelledby="filler">
      <h2 id="filler">Filler and time</h2>
      <dl className="weld-lines">
        {rows.map(([name, value]) => (
          <div key={name}>
            <dt>{name}</dt>
            <dd>{value}</dd>
          </div>
        ))}
      </dl>
    </section>
  )
}
