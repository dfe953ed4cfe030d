import { showDial } from '@/lib/trade/quantity/dial'
import { showTape } from '@/lib/trade/quantity/tape'
import type { HandrailOutputs, RailPart } from '@/lib/trade/rail/types'
import { closingText, endText, sectionText, sticksText } from '@/lib/trade/rail/words'
import type { Reading } from './reading-of'
import type { Rail } from './use-handrail'

/** A cut list to send as a message: what to cut, where the brackets go, what to mind, where to find it again. */
export function cutListText({ given, solved }: Rail, reading: Reading, address: string): string {
  const { tape, dial } = reading.precision
  const length = (inches: number) => showTape(inches, tape)
  const warnings = solved.warnings.map(({ message }) => message)
  return [
    `CUT LIST, handrail, ${solved.hand === 'L' ? 'LEFT' : 'RIGHT'} hand going up`,
    `${sectionText(given.section, tape)}, ${length(given.railHeight)} to top of rail. Saw reads ${reading.preferences.sawSquare} at square. Lengths to 1/${tape}".`,
    '',
    ...solved.parts.flatMap((part) => partLines(part, reading)),
    ...solved.returns.map(
      ({ end, longPoint, shortPoint }) =>
        `Return at the ${end}: long point ${length(longPoint)}, short point ${length(shortPoint)}, 45° in plan`,
    ),
    '',
    ...solved.joints.map(
      ({ included }, i) =>
        `Joint ${solved.parts[i]?.mark}-${solved.parts[i + 1]?.mark}: hold ${showDial(included, dial)}`,
    ),
    ...bracketLines(solved, tape),
    ...(solved.stock ? ['', `Sticks: ${sticksText(solved.stock)}`] : []),
    ...solved.closing.map((closing) => `Flight ${closing.flight}: ${closingText(closing, tape)}`),
    ...(warnings.length > 0 ? ['', ...warnings] : []),
    '',
    'Dry-fit on the stair before you weld out. The adopted local code and a licensed professional decide.',
    address,
  ].join('\n')
}

function partLines(part: RailPart, { precision: { tape, dial }, preferences }: Reading): string[] {
  return [
    `${part.mark}  ${part.kind}`,
    `   top edge ${showTape(part.topEdge, tape)}, underside ${showTape(part.underside, tape)}, blank ${showTape(part.overall, tape)}`,
    `   low end ${endText(part.endA, dial, preferences.sawSquare)}; high end ${endText(part.endB, dial, preferences.sawSquare)}`,
    `   ${[part.cuts, part.turn, part.note].filter(Boolean).join('; ')}`,
  ]
}

function bracketLines({ brackets }: HandrailOutputs, tape: number): string[] {
  if (!brackets || brackets.length === 0) return []
  const lines = brackets.map((bracket) => {
    if ('off' in bracket) return `   ${bracket.n}: beyond the rail`
    const along = [bracket.alongUndersideFromLowEnd].flat().map((mark) => showTape(mark, tape))
    return `   ${'n' in bracket ? `${bracket.n} on ` : ''}${bracket.part}: ${along.join(' · ')}`
  })
  return ['', 'Bracket centres on the underside, from the low end:', ...lines]
}
