import type { BracketOffRail, FieldBracket, HandrailOutputs, SpacedBrackets } from '@/lib/trade/rail/types'
import type { Line, List } from './sheet'

type AnyBracket = SpacedBrackets | FieldBracket | BracketOffRail

/** Running marks for the brackets, each part from its own low end on the underside. */
export function bracketList(brackets: HandrailOutputs['brackets']): List | null {
  if (!brackets || brackets.length === 0) return null
  const all: readonly AnyBracket[] = brackets
  const spaced = all.filter((bracket): bracket is SpacedBrackets => !('n' in bracket))
  const off = all.filter((bracket): bracket is BracketOffRail => 'off' in bracket)
  const field = all.filter((bracket): bracket is FieldBracket => 'n' in bracket && !('off' in bracket))
  const parts = [...new Set(field.map(({ part }) => part))]
  return {
    title: 'Bracket centres on the underside, running from the low end',
    rows: [
      ...spaced.map(({ part, alongUndersideFromLowEnd }) => ({ name: part, line: running(alongUndersideFromLowEnd) })),
      ...parts.map((name) => ({ name, line: numbered(field.filter(({ part }) => part === name)) })),
      ...(off.length > 0 ? [{ name: 'Off', line: [`beyond the rail: ${off.map(({ n }) => n).join(', ')}`] }] : []),
    ],
  }
}

const parted = (lines: readonly Line[]): Line => lines.flatMap((line, i) => (i > 0 ? [' · ', ...line] : line))

const running = (marks: readonly number[]): Line => parted(marks.map((tape) => [{ tape }]))

/** Brackets taped on the stair keep the numbers they were given. */
const numbered = (brackets: readonly FieldBracket[]): Line =>
  parted(
    brackets.map(({ n, alongUndersideFromLowEnd, tooCloseToJoint }) => [
      `${n}: `,
      { tape: alongUndersideFromLowEnd },
      ...(tooCloseToJoint ? [{ strong: ' too close to a joint' }] : []),
    ]),
  )
