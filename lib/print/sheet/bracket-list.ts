import type { BracketOffRail, FieldBracket, HandrailOutputs, SpacedBrackets } from '@/lib/trade/rail/types'
import type { Line, List } from './sheet'

type AnyBracket = SpacedBrackets | FieldBracket | BracketOffRail

/** Running marks for the brackets, each part from its own low end on the underside. */
export function bracketList(brackets: HandrailOutputs['brackets']): List | null {
  if (!brackets || brackets.length === 0) return null
  return {
    title: 'Bracket centres on the underside, running from the low end',
    rows: (brackets as AnyBracket[]).map(rowOf),
  }
}

function rowOf(bracket: AnyBracket): List['rows'][number] {
  if ('off' in bracket) return { name: String(bracket.n), line: ['beyond the rail'] }
  if ('n' in bracket) {
    const close = bracket.tooCloseToJoint ? [' too close to a joint'] : []
    return { name: `${bracket.n} on ${bracket.part}`, line: [{ tape: bracket.alongUndersideFromLowEnd }, ...close] }
  }
  return { name: bracket.part, line: running(bracket.alongUndersideFromLowEnd) }
}

const running = (marks: readonly number[]): Line => marks.flatMap((tape, i) => (i > 0 ? [' · ', { tape }] : [{ tape }]))
