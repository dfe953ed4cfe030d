import { dialParts, showDial } from '@/lib/trade/quantity/dial'
import { showMetric } from '@/lib/trade/quantity/metric'
import { showTape, tapeParts } from '@/lib/trade/quantity/tape'

/** A fraction set as a fraction. Read aloud by whoever wraps it. */
export function Fraction({ numerator, denominator }: { numerator: number; denominator: number }) {
  return (
    <span className="fraction">
      <span>{numerator}</span>
      <span>{denominator}</span>
    </span>
  )
}

interface TapeProps {
  inches: number
  /** Finest division of the reader's tape. */
  den: number
  /** Shows millimetres first, the tape small beside. */
  units?: 'in' | 'mm'
  /** Adds the exact decimal, small. */
  exact?: boolean
}

/** A length as the tape shows it: feet and inches with prime marks, the fraction stacked. */
export function Tape({ inches, den, units = 'in', exact }: TapeProps) {
  const text = showTape(inches, den)
  if (units === 'mm') {
    return (
      <span className="reading">
        {showMetric(inches)} <small>{text}</small>
      </span>
    )
  }
  return (
    <span className="reading">
      <span className="sr-only">{text}</span>
      <TapeGlyphs inches={inches} den={den} />
      {exact && <small>{Number(inches.toFixed(4))} in</small>}
    </span>
  )
}

function TapeGlyphs({ inches, den }: { inches: number; den: number }) {
  const parts = tapeParts(inches, den)
  const bare = parts.feet === 0 && parts.inches === 0 && parts.numerator > 0
  return (
    <span aria-hidden="true" className="whitespace-nowrap">
      {parts.negative && '−'}
      {parts.feet > 0 && <span className="feet">{parts.feet}′</span>}
      {!bare && parts.inches}
      {parts.numerator > 0 && <Fraction numerator={parts.numerator} denominator={parts.denominator} />}″
    </span>
  )
}

interface DialProps {
  deg: number
  /** Finest step of the reader's dial. */
  step: number
  exact?: boolean
}

/** An angle as the dial shows it. */
export function Dial({ deg, step, exact }: DialProps) {
  const parts = dialParts(deg, step)
  const bare = parts.whole === 0 && parts.numerator > 0
  return (
    <span className="reading">
      <span className="sr-only">{showDial(deg, step)}</span>
      <span aria-hidden="true" className="whitespace-nowrap">
        {parts.negative && '−'}
        {!bare && parts.whole}
        {parts.numerator > 0 && <Fraction numerator={parts.numerator} denominator={parts.denominator} />}°
      </span>
      {exact && <small>{Number(deg.toFixed(2))}°</small>}
    </span>
  )
}
