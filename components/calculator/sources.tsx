import type { AnyCalculator } from '@/lib/calculators/define'

/** What the formulas rest on. */
export function Sources({ sources, basis }: Pick<AnyCalculator, 'sources' | 'basis'>) {
  return (
    <section aria-labelledby="sources">
      <h2 id="sources">Sources</h2>
      <p className="mb-2 text-mute">Basis: {basis}.</p>
      <ul className="sources">
        {sources.map(({ says, where }) => (
          <li key={says}>
            {says} <span className="text-mute">{where}</span>
          </li>
        ))}
      </ul>
    </section>
  )
}
