import { isRefusal, refuse } from '@/lib/trade/refusal'
import { solveHandrail } from '@/lib/trade/rail/solve'
import type { HandrailInputs, HandrailOutputs } from '@/lib/trade/rail/types'
import { defineCalculator } from '../define'
import { handrailFields } from './handrail-fields'
import { handrailOutputs } from './handrail-outputs'
import { handrailSteps } from './handrail-steps'

/** From the whole rail the numbers that sensitivity and the phone speak of. */
type Solved = HandrailOutputs & { totalTopEdge: number }

const totalOf = ({ parts }: HandrailOutputs) => parts.reduce((sum, { topEdge }) => sum + topEdge, 0)

/** A whole handrail from its field measure: parts, cuts, brackets, sticks, filler, code rows. Inches and degrees. */
export const handrail = defineCalculator({
  id: 'handrail',
  revision: 1,
  stage: 'field',
  name: 'Handrail from a field measure',
  asks: 'Here is my field measure; what do I cut?',
  lede: 'Give the stair as you taped it, from the bottom up. Every part, cut, bracket mark and stick follows.',
  alsoCalled: ['railing', 'stair rail', 'guard rail', 'banister', 'grab rail', 'cut sheet', 'porch rail', 'stoop rail'],
  example: {
    hand: 'L',
    section: { shape: 'round', depth: '1.66', width: '1.66' },
    railHeight: '36',
    flights: [
      { nosingRise: '35', nosingRun: `55`, nosingRake: '65 3/16', firstRise: '7', run: '11' },
      { nosingRise: '39', nosingRun: `72`, nosingRake: '81 7/8', firstRise: '6 1/2', run: '12' },
    ],
    landings: [{ length: '48', slopeInPerFt: '-1/8' }],
    bottom: { type: 'slope', horizontal: '11' },
    top: { type: 'level', length: '12' },
    brackets: { endDistance: '6', maxSpacing: '48' },
    stock: { length: '240', kerf: '1/16', trim: '1/2' },
  },
  inputs: handrailFields,
  outputs: {
    ...handrailOutputs,
    totalTopEdge: { kind: 'value', label: 'Top of the rail, end to end', unit: 'in', round: 'tape' },
  },
  answer: 'totalTopEdge',
  glance: ['totalTopEdge', 'pitches', 'hand'],
  solve(given, precision) {
    const solved = solveHandrail(given as HandrailInputs, precision)
    if (isRefusal(solved)) return refuse(solved.field, solved.message)
    return { ...solved, totalTopEdge: totalOf(solved) } satisfies Solved
  },
  warn: (_given, { warnings }) => warnings,
  steps: (_given, solved) => handrailSteps(solved),
  cautions: [
    {
      signal: 'warning',
      text: 'Dry-fit on the stair before you weld out. A rail that fails lets somebody fall: the adopted local code and a licensed professional decide heights, loads and fixings.',
    },
    {
      signal: 'caution',
      text: 'Trust rise and run by tape and plumb over the angle finder: 1° over 14 ft is 3 in.',
      beside: 'flights',
    },
    {
      signal: 'notice',
      text: 'A landing rail between straight flights is one upper tread shorter than nosing to nosing. The numbers here have it taken off.',
      beside: 'landings',
      when: ({ landings }) => (landings?.length ?? 0) > 0,
    },
    {
      signal: 'notice',
      text: 'The volute belongs to the overall length: it is taken off the part, and marks run from the cut end.',
      beside: 'volutes',
      when: ({ volutes }) => volutes !== null,
    },
    {
      signal: 'caution',
      text: 'Bracket marks on the underside are plumbed from the top, not squared across the bar.',
      beside: 'brackets',
      when: (_given, { brackets }) => (brackets?.length ?? 0) > 0,
    },
    {
      signal: 'notice',
      text: 'The rows compare your figures with limits as printed. They do not decide: the adopted local code and a licensed professional do.',
      beside: 'checks',
      when: (_given, { checks }) => checks !== undefined,
    },
  ],
  sources: [
    {
      says: 'The top line is the nosing line copied plumb at rail height; neighbouring bars share the bend.',
      where: 'common practice (geometry), no published source',
    },
    { says: 'Limits of the code rows.', where: 'the section named in each row' },
  ],
  related: ['miter', 'long-short-point', 'cut-list', 'field-check', 'nosing-line', 'knuckle-height'],
  basis: 'common practice (geometry)',
})
