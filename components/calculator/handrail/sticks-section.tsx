import type { Reading } from './reading-of'
import { LaidSticks } from './sticks'
import type { Rail } from './use-handrail'

/** The sticks to buy with the parts laid in them. */
export function Sticks({ rail, reading }: { rail: Rail; reading: Reading }) {
  const { stock } = rail.solved
  if (!rail.given.stock || stock === undefined) return null
  return (
    <section aria-labelledby="sticks">
      <h2 id="sticks">Sticks</h2>
      {stock ? (
        <LaidSticks stock={stock} rail={rail} reading={reading} />
      ) : (
        <p>A part is longer than the stick: the remarks name it.</p>
      )}
    </section>
  )
}
