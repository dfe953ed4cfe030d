import type { HandrailOutputs, RailJoint, RailPart } from '@/lib/trade/rail/types'
import type { Step } from '../define'

const number = (value: number) => String(Number(value.toFixed(4)))

/** The working of a rail: its slopes, each knuckle's half bend, each part from knuckle to knuckle. */
export function handrailSteps({ pitches, joints, parts, topLine }: HandrailOutputs): Step[] {
  return [
    ...pitches.map((pitch, i): Step => ({
      says: `Pitch of flight ${i + 1}: rise over run, nosing to nosing.`,
      value: `${number(pitch)}°`,
    })),
    ...joints.map((joint, i) => jointStep(joint, parts[i], parts[i + 1])),
    ...parts.map((part, i) => partStep(part, topLine[i]?.x, topLine[i + 1]?.x)),
  ]
}

function jointStep({ miter }: RailJoint, below?: RailPart, above?: RailPart): Step {
  return {
    says: `Joint ${below?.mark ?? ''}–${above?.mark ?? ''}: half the bend between the two slopes.`,
    formula: 'miter = abs(slopeBelow - slopeAbove) / 2',
    substituted: `abs(${number(below?.slope ?? 0)} - ${number(above?.slope ?? 0)}) / 2`,
    value: `${number(miter)}°`,
  }
}

function partStep({ mark, slope, topEdge }: RailPart, from = 0, to = 0): Step {
  return {
    says: `Part ${mark}: the level distance between its knuckles over the cosine of its slope, less any volute.`,
    formula: 'topEdge = level / cos(slope)',
    substituted: `${number(to - from)} / cos(${number(slope)})`,
    value: `${number(topEdge)} in`,
  }
}
