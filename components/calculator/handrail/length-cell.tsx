import { Tape } from '../../ui/tape'
import type { Reading } from './reading-of'

/** A length to cut or mark: to the tape, with the exact decimal small under it. */
export function LengthCell({ inches, reading }: { inches: number; reading: Reading }) {
  return (
    <>
      <b className="cut-length">
        <Tape inches={inches} den={reading.precision.tape} units={reading.preferences.units} />
      </b>
      <small>{inches.toFixed(3)} in</small>
    </>
  )
}
