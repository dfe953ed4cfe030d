import { partsOf, showParts } from './fraction'

/** A length as a tape shows it, for stacked fractions on screen and paper. */
export interface TapeParts {
  negative: boolean
  feet: number
  inches: number
  /** 0 when the inches are whole. */
  numerator: number
  denominator: number
}

/** Splits inches into feet, inches and the nearest 1/den in. */
export function tapeParts(inches: number, den: number): TapeParts {
  const { negative, whole, numerator, denominator } = partsOf(inches, den)
  return { negative, feet: Math.floor(whole / 12), inches: whole % 12, numerator, denominator }
}

/** Inches as text to the nearest 1/den: `11'-11 3/8"`, `7/16"`, `-2'-0"`. */
export function showTape(inches: number, den: number): string {
  const { negative, feet, inches: whole, numerator, denominator } = tapeParts(inches, den)
  const rest =
    feet > 0 && whole === 0 && numerator > 0
      ? `0 ${numerator}/${denominator}`
      : showParts({ negative, whole, numerator, denominator })
  return `${negative ? '-' : ''}${feet > 0 ? `${feet}'-` : ''}${rest}"`
}
