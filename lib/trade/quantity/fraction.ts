/** A number split for display: whole part and reduced fraction, sign apart. */
export interface Parts {
  negative: boolean
  whole: number
  /** 0 when the number is whole. */
  numerator: number
  denominator: number
}

const divisor = (a: number, b: number): number => (b === 0 ? a : divisor(b, a % b))

/** Splits a number at the nearest 1/den; halves go away from zero, as a tape is read. */
export function partsOf(value: number, den: number): Parts {
  const ticks = Math.round(Math.abs(value) * den)
  const rest = ticks % den
  const common = divisor(den, rest)
  return {
    negative: value < 0 && ticks > 0,
    whole: Math.floor(ticks / den),
    numerator: rest / common,
    denominator: den / common,
  }
}

/** Whole and fraction as typed: `16 1/4`, `3/8`, `0`. */
export function showParts({ whole, numerator, denominator }: Parts): string {
  if (numerator === 0) return String(whole)
  const fraction = `${numerator}/${denominator}`
  return whole === 0 ? fraction : `${whole} ${fraction}`
}
