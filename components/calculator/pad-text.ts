/** A measure as it grows under the pad: `-6' 2 1/2`. Text in, text out; whatever the pad cannot have written is begun anew. */

interface Typed {
  minus: boolean
  feet: string
  /** Digits, with a point where one was pressed. */
  whole: string
  numerator: number
  denominator: number
}

export type PadKey = '0' | '1' | '2' | '3' | '4' | '5' | '6' | '7' | '8' | '9' | '.' | 'ft' | '-' | 'back'

const nothing: Typed = { minus: false, feet: '', whole: '', numerator: 0, denominator: 1 }
const written =
  /^(?<minus>[-−])?\s*(?:(?<feet>\d+)\s*['′]\s*-?\s*)?(?<whole>\d*\.?\d*(?!\d*\/))?(?:[\s-]*(?<numerator>\d+)\/(?<denominator>\d+))?\s*["″]?$/

function readTyped(text: string): Typed {
  const groups = written.exec(text.trim())?.groups
  if (!groups) return nothing
  return {
    minus: groups.minus !== undefined,
    feet: groups.feet ?? '',
    whole: groups.whole ?? '',
    numerator: Number(groups.numerator ?? 0),
    denominator: Number(groups.denominator ?? 1) || 1,
  }
}

function writeTyped({ minus, feet, whole, numerator, denominator }: Typed): string {
  const parts = [feet && `${feet}'`, whole, numerator > 0 ? `${numerator}/${denominator}` : ''].filter(Boolean)
  return `${minus ? '-' : ''}${parts.join(' ')}`
}

const pressers: Partial<Record<PadKey, (typed: Typed) => Typed>> = {
  '-': (typed) => ({ ...typed, minus: !typed.minus }),
  // A fraction and a decimal in one number would say it twice.
  '.': (typed) => (typed.whole.includes('.') ? typed : { ...typed, whole: `${typed.whole || '0'}.`, numerator: 0 }),
  ft: (typed) => (typed.feet === '' && /^\d+$/.test(typed.whole) ? { ...typed, feet: typed.whole, whole: '' } : typed),
  back: backspace,
}

function backspace(typed: Typed): Typed {
  if (typed.numerator > 0) return { ...typed, numerator: 0 }
  if (typed.whole !== '') return { ...typed, whole: typed.whole.slice(0, -1) }
  if (typed.feet !== '') return { ...typed, feet: '', whole: typed.feet }
  return nothing
}

/** The text after a key. `fresh`: the field was only just chosen, so a digit starts over. */
export function pressKey(text: string, key: PadKey, fresh: boolean): string {
  const typed = readTyped(text)
  const press = pressers[key]
  if (press) return writeTyped(press(typed))
  return writeTyped(fresh ? { ...nothing, whole: key } : { ...typed, whole: `${typed.whole}${key}` })
}

/** The text with its fraction set to so many divisions of an inch (or degree); none takes the fraction away. */
export function setFraction(text: string, divisions: number, den: number): string {
  const typed = readTyped(text)
  const shared = commonDivisor(divisions, den)
  const whole = typed.whole.split('.')[0] ?? ''
  return writeTyped({
    ...typed,
    whole: divisions === 0 && whole === '' && typed.feet === '' ? '0' : whole,
    numerator: divisions / shared,
    denominator: den / shared,
  })
}

const commonDivisor = (a: number, b: number): number => (b === 0 ? a || 1 : commonDivisor(b, a % b))
