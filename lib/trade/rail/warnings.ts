import { atMost, hair } from '../tolerance'
import { heightsOf } from './code'
import type {
  BracketOffRail,
  Closing,
  FieldBracket,
  HandrailInputs,
  RailJoint,
  RailPart,
  RailWarning,
  SpacedBrackets,
  SpacedBracketsGiven,
} from './types'

const inches = (value: number) => `${Number(value.toFixed(2))} in`

/** Parts that are hard to hold and to weld. */
function shortParts(parts: readonly RailPart[]): RailWarning[] {
  return parts
    .filter(({ topEdge, underside }) => Math.min(topEdge, underside) < 6 - hair)
    .map(({ mark, kind, topEdge, underside }) => ({
      message: `Part ${mark} (${kind}) is only ${inches(Math.min(topEdge, underside))} on its shorter edge: under 6 in is hard to hold and to weld.`,
    }))
}

function unusualHeights(field: HandrailInputs): RailWarning[] {
  return heightsOf(field)
    .filter(({ height }) => height < 34 - hair || height > 38 + hair)
    .map(({ field: at, height }) => ({
      field: at,
      message: `A rail at ${inches(height)} is outside the usual 34 to 38 in: check that it was taped plumb to the top of the rail.`,
    }))
}

function steepJoints(joints: readonly RailJoint[], parts: readonly RailPart[]): RailWarning[] {
  return joints.flatMap(({ miter }, i) =>
    miter > 45 + hair
      ? [
          {
            message: `The cut between parts ${parts[i]?.mark} and ${parts[i + 1]?.mark} is past 45°: a saw does not reach it.`,
          },
        ]
      : [],
  )
}

/** Gaps between neighbouring brackets along the rail, over knuckles too. */
export function wideGaps(
  parts: readonly RailPart[],
  brackets: readonly SpacedBrackets[],
  { maxSpacing }: SpacedBracketsGiven,
): RailWarning[] {
  const warnings: RailWarning[] = []
  let since: { distance: number; part: string } | null = null
  for (const { mark, topEdge } of parts) {
    const marks = brackets.find(({ part }) => part === mark)?.alongTopFromLowEnd ?? []
    const [first, last] = [marks[0], marks.at(-1)]
    if (first === undefined || last === undefined) {
      if (since) since.distance += topEdge
      continue
    }
    if (since && !atMost(since.distance + first, maxSpacing)) {
      const gap = inches(since.distance + first)
      warnings.push({
        field: 'brackets.maxSpacing',
        message: `${gap} between the last bracket on part ${since.part} and the first on part ${mark}: over the greatest spacing.`,
      })
    }
    since = { distance: topEdge - last, part: mark }
  }
  return warnings
}

/** Marks that cannot be made on the underside, or stand alone. */
export function awkwardMarks(parts: readonly RailPart[], brackets: readonly SpacedBrackets[]): RailWarning[] {
  return brackets.flatMap(({ part: mark, alongTopFromLowEnd, alongUndersideFromLowEnd }) => {
    const edge = parts.find((part) => part.mark === mark)?.underside ?? 0
    const off = alongUndersideFromLowEnd.some((along) => along < -hair || along > edge + hair)
    return [
      ...(alongTopFromLowEnd.length === 1
        ? [
            {
              field: 'brackets.endDistance',
              message: `Part ${mark} is too short for two brackets at this end distance: one is set in its middle.`,
            },
          ]
        : []),
      ...(off
        ? [
            {
              field: 'brackets.endDistance',
              message: `A bracket on part ${mark} plumbs past the end of its underside: move it in.`,
            },
          ]
        : []),
    ]
  })
}

/** Field brackets that miss the rail or crowd a knuckle. */
export function fieldBracketWarnings(brackets: readonly (FieldBracket | BracketOffRail)[]): RailWarning[] {
  return brackets.flatMap((bracket) => {
    const field = `brackets.field[${bracket.n - 1}]`
    if ('off' in bracket) return [{ field, message: `Bracket ${bracket.n} stands beyond the rail.` }]
    return bracket.tooCloseToJoint
      ? [{ field, message: `Bracket ${bracket.n} is too close to a knuckle of part ${bracket.part}.` }]
      : []
  })
}

function openClosings(closing: readonly Closing[]): RailWarning[] {
  return closing
    .filter(({ verdict }) => verdict !== 'agree')
    .map(({ flight, error }) => ({
      field: `flights[${flight - 1}].nosingRake`,
      message: `Flight ${flight} does not close by ${inches(Math.abs(error))}: measure again before cutting.`,
    }))
}

/** What a reader should look at before cutting, that refuses nothing. */
export function railWarnings(
  field: HandrailInputs,
  parts: readonly RailPart[],
  joints: readonly RailJoint[],
  closing: readonly Closing[],
): RailWarning[] {
  const { shape, depth, width } = field.section
  const uneven = shape !== 'rect' && Math.abs(depth - width) > hair
  return [
    ...(uneven
      ? [{ field: 'section.width', message: `A ${shape} section is as wide as it is deep: check the two.` }]
      : []),
    ...unusualHeights(field),
    ...shortParts(parts),
    ...steepJoints(joints, parts),
    ...openClosings(closing),
  ]
}
