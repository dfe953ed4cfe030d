import { notNegative, positive } from '../checks'
import { firstRefusal, refuse, type Refusal } from '../refusal'
import type { BottomEnd, HandrailInputs, Landing, TopEnd } from './types'

type Fault = Refusal | null

/** A height that may be left out must be a height when it is given. */
const height = (field: string, value: number | null | undefined): Fault =>
  value === null || value === undefined ? null : positive(field, value, 'The rail height')

function landingFaults(landings: readonly Landing[], flights: number): Fault[] {
  const wanted = Math.max(0, flights - 1)
  const count =
    landings.length === wanted
      ? null
      : refuse('landings', `Give one landing fewer than flights: ${wanted}, bottom to top.`)
  return [
    count,
    ...landings.flatMap(({ length, railHeight, slopeInPerFt }, i) => [
      positive(`landings[${i}].length`, length, 'The length of a landing'),
      height(`landings[${i}].railHeight`, railHeight),
      finite(`landings[${i}].slopeInPerFt`, slopeInPerFt),
    ]),
  ]
}

const finite = (field: string, value: number | null | undefined): Fault =>
  Number.isFinite(value ?? 0) ? null : refuse(field, 'The slope must be a number of inches in a foot.')

function bottomFaults(bottom: BottomEnd): Fault[] {
  return [
    bottom.type === 'slope'
      ? positive('bottom.horizontal', bottom.horizontal, 'The reach of a sloped end, level,')
      : null,
    bottom.type === 'level' ? positive('bottom.length', bottom.length, 'The length of a level end') : null,
    height('bottom.railHeight', bottom.railHeight),
  ]
}

function topFaults(top: TopEnd): Fault[] {
  return [
    top.type === 'level' ? positive('top.length', top.length, 'The length of a level end') : null,
    height('top.railHeight', top.railHeight),
    finite('top.slopeInPerFt', top.slopeInPerFt),
  ]
}

/** A volute ends the rail in a scroll, a return in the wall: no end can do both. */
function voluteFaults({ volutes, bottom, top }: HandrailInputs): Fault[] {
  const clash = (end: 'bottom' | 'top', other: unknown): Fault =>
    volutes?.[end] && other ? refuse(`volutes.${end}`, 'An end takes a volute or a return, not both.') : null
  return [
    notNegative('volutes.bottom', volutes?.bottom ?? 0, 'What the volute takes off'),
    notNegative('volutes.top', volutes?.top ?? 0, 'What the volute takes off'),
    clash('bottom', bottom.return),
    clash('top', top.return),
  ]
}

function bracketFaults({ brackets }: HandrailInputs): Fault[] {
  if (!brackets) return []
  if ('field' in brackets) {
    return [
      notNegative('brackets.jointClear', brackets.jointClear ?? 0, 'The clear distance to a joint'),
      ...brackets.field.map((x, i) =>
        Number.isFinite(x)
          ? null
          : refuse(`brackets.field[${i}]`, 'A bracket stands at a number of inches from the bottom nosing.'),
      ),
    ]
  }
  return [
    notNegative('brackets.endDistance', brackets.endDistance, 'The end distance'),
    positive('brackets.maxSpacing', brackets.maxSpacing, 'The greatest spacing'),
  ]
}

function codeFaults({ code }: HandrailInputs): Fault[] {
  if (!code) return []
  return [
    positive('code.outsideDia', code.outsideDia, 'The outside diameter'),
    notNegative('code.wallClearance', code.wallClearance, 'The clearance to the wall'),
  ]
}

/** The first input that is wrong by itself, before any geometry; `null` when all can be tried. */
export function inputFault(field: HandrailInputs): Refusal | null {
  const { section, railHeight, flights, landings, bottom, top } = field
  return firstRefusal([
    positive('section.depth', section.depth, 'The depth of the section'),
    positive('section.width', section.width, 'The width of the section'),
    positive('railHeight', railHeight, 'The rail height'),
    flights.length > 0 ? null : refuse('flights', 'Give at least one flight.'),
    ...landingFaults(landings ?? [], flights.length),
    ...bottomFaults(bottom),
    ...topFaults(top),
    ...voluteFaults(field),
    ...bracketFaults(field),
    ...codeFaults(field),
  ])
}
