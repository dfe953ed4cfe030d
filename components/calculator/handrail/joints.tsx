'use client'

import type { RailJoint, RailPart, RailReturn } from '@/lib/trade/rail/types'
import { Tape } from '../../ui/tape'
import { usePartLight } from './lit'
import type { Reading } from './reading-of'

interface JointsProps {
  joints: readonly RailJoint[]
  parts: readonly RailPart[]
  returns: readonly RailReturn[]
  reading: Reading
}

/** Joints with the angle to hold and what the dial costs, and the pieces that turn to the wall. */
export function Joints({ joints, parts, returns, reading }: JointsProps) {
  return (
    <section aria-labelledby="joints">
      <h2 id="joints">Joints</h2>
      {joints.length === 0 && returns.length === 0 && <p>None: the rail is one piece.</p>}
      <ul className="rail-lines">
        {joints.map((joint, i) => (
          <JointLine key={i} joint={joint} below={parts[i]?.mark} above={parts[i + 1]?.mark} />
        ))}
        {returns.map((piece) => (
          <ReturnLine
            key={piece.end}
            piece={piece}
            part={piece.end === 'bottom' ? parts[0] : parts.at(-1)}
            reading={reading}
          />
        ))}
      </ul>
    </section>
  )
}

function JointLine({ joint, below, above }: { joint: RailJoint; below?: string; above?: string }) {
  const light = usePartLight(above)
  const { included, dialGap, perimeter, longPointFace } = joint
  return (
    <li {...light}>
      <b className="line-name">
        {below}–{above}
      </b>
      <span>
        hold <b className="line-number">{included.toFixed(1)}°</b>
        {longPointFace === 'none'
          ? ', straight on'
          : `, ${longPointFace === 'top' ? 'long on top' : 'long underneath'}`}
        <small>
          the dial leaves a gap of {dialGap.toFixed(3)} in; {perimeter.toFixed(1)} in of weld around
        </small>
      </span>
    </li>
  )
}

function ReturnLine({ piece, part, reading }: { piece: RailReturn; part?: RailPart; reading: Reading }) {
  const light = usePartLight(part?.mark)
  const { precision, preferences } = reading
  const length = (inches: number) => <Tape inches={inches} den={precision.tape} units={preferences.units} />
  return (
    <li {...light}>
      <b className="line-name">{part?.mark} return</b>
      <span>
        long point <b className="line-number">{length(piece.longPoint)}</b>, short point {length(piece.shortPoint)},
        turns {piece.turns} to the wall going up
        <small>
          45° in plan on the rail end, square at the wall;
          {Math.abs(piece.rolledWithRake) >= 0.005 &&
            ` rolled with the rake by ${piece.rolledWithRake.toFixed(2)}°;`}{' '}
          centre line {length(piece.centre)}; {piece.weld.toFixed(1)} in of weld around
        </small>
      </span>
    </li>
  )
}
