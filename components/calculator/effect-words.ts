import type { AnyCalculator } from '@/lib/calculators/define'
import type { Effect } from '@/lib/calculators/sensitivity'

const slips: Readonly<Record<Effect['unit'], string>> = { in: '1/16 in', deg: '1/2°', 'in/ft': '1/8 in per ft' }

/** A change small enough that no tape or dial shows it. */
const unseen = 0.0005

/** One slip and what it does, in words: “1/16 in in the run moves the answer 0.02°.” */
export function effectSentence({ label, unit, change }: Effect, calculator: AnyCalculator): string {
  const said = `${slips[unit]} in “${label}”`
  return change < unseen
    ? `${said} does not move the answer.`
    : `${said} moves the answer ${amount(change, unitOfAnswer(calculator))}.`
}

function unitOfAnswer({ outputs, answer, exactAnswer }: AnyCalculator): string {
  const output = outputs[exactAnswer ?? answer]
  return output?.kind === 'value' ? output.unit : 'none'
}

function amount(change: number, unit: string): string {
  const digits = change < 0.1 ? change.toFixed(3) : change.toFixed(2)
  if (unit === 'deg') return `${digits}°`
  return unit === 'none' || unit === 'text' || unit === 'flag' ? `by ${digits}` : `${digits} ${unit}`
}
