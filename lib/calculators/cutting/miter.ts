import { miterAt } from '@/lib/trade/miter'
import { refuse } from '@/lib/trade/refusal'
import { defineCalculator, type Note } from '../define'
import { choice, degrees, inches, readersDial } from '../fields'
import { onDial, onTape, toDecimals, words } from '../outputs'

/** Saw setting where two bars meet: half the bend on each. Degrees, up positive; depth in inches. */
export const miter = defineCalculator({
  id: 'miter',
  revision: 1,
  stage: 'cutting',
  name: 'Miter where two runs meet',
  asks: 'What do I set the saw to, and which face is long?',
  lede: 'Half the bend on each piece. Give the slope on each side of the knuckle; the saw setting and the long face follow.',
  alsoCalled: ['mitre', 'half the bend', 'chop saw angle', 'bevel', 'knuckle cut', 'transition'],
  example: { slopeBelow: '33.7', slopeAbove: '0', depth: '1 1/2' },
  inputs: {
    slopeBelow: degrees('Slope below the knuckle', {
      sane: [-60, 60],
      least: -90,
      most: 90,
      hint: 'Up going up the stairs is positive; a level run is 0.',
      symbol: 's_{below}',
    }),
    slopeAbove: degrees('Slope above the knuckle', { sane: [-60, 60], least: -90, most: 90, symbol: 's_{above}' }),
    depth: inches('Bar, seen from the side', { above: 0, most: 24, fallback: 1.5, symbol: 'd' }),
    dialStep: choice('Finest step of the dial', [0.25, 0.5, 1], {
      fallback: readersDial,
      names: ['1/4°', '1/2°', '1°'],
    }),
  },
  outputs: {
    bend: toDecimals('Bend', 'deg', 2, { symbol: 'b' }),
    miter: toDecimals('Miter, exactly', 'deg', 2, { symbol: 'm', hint: 'half the bend' }),
    included: toDecimals('Angle to hold at the joint', 'deg', 1, { hint: 'check with the bevel after tacking' }),
    sawSquareIs0: onDial('Set the saw, 0 is square'),
    sawSquareIs90: onDial('Set the saw, 90 is square'),
    longPointFace: words('Long point', { hint: 'both pieces' }),
    setback: onTape('Each piece loses', { symbol: 'k', hint: 'from long point to short point' }),
    dialGap: toDecimals('The dial costs', 'in', 3, { hint: 'gap at the short point when set to the step' }),
  },
  answer: 'sawSquareIs0',
  exactAnswer: 'miter',
  glance: ['sawSquareIs0', 'longPointFace', 'setback', 'included'],
  solve({ slopeBelow, slopeAbove, depth, dialStep }) {
    const bend = Math.abs(slopeBelow - slopeAbove)
    if (bend > 90)
      return refuse('slopeAbove', 'The bars bend more than 90°, past what a saw can halve: check both slopes.')
    return miterAt(slopeBelow, slopeAbove, depth, dialStep)
  },
  precisionOf: ({ dialStep }, asked) => ({ ...asked, dial: dialStep }),
  warn: (_given, { bend, miter: half }): Note[] => {
    if (bend > 0 && half < 1) return [{ message: 'Under 1° each: bend the bar or butt it square.' }]
    if (half > 25) return [{ message: 'Over 25° each is steep for a stair knuckle: check both slopes.' }]
    return []
  },
  shown: {
    bend: { says: 'The bend is the turn between the two slopes.', formula: 'abs(slopeBelow - slopeAbove)' },
    miter: { says: 'The joint face splits the bend in two; each piece takes half.', formula: 'bend / 2' },
    included: { says: 'What is left of a straight line is the angle to hold.', formula: '180 - bend' },
    setback: {
      says: 'The bar is as deep as it is, so the long point stands this far past the short point.',
      formula: 'depth * tan(miter)',
    },
    sawSquareIs0: { says: 'Round once, to the step of the dial.', formula: 'round(miter / dialStep) * dialStep' },
    sawSquareIs90: { says: 'A saw that calls square 90 reads what is left of 90.', formula: '90 - sawSquareIs0' },
    dialGap: {
      says: 'Both cuts miss by the rounding; it opens across the joint face.',
      formula: '2 * depth / cos(miter) * tan(abs(miter - sawSquareIs0))',
    },
  },
  steps: (_given, { longPointFace }) => [
    {
      says: 'Going up the stairs: the line turns down, long on top; it turns up, long underneath.',
      value: String(longPointFace),
    },
  ],
  cautions: [
    {
      signal: 'caution',
      text: 'Halve the bend, not the pitch. They agree only where one side is level.',
      beside: 'slopeAbove',
      when: ({ slopeBelow, slopeAbove }) => slopeBelow !== 0 && slopeAbove !== 0,
    },
    {
      signal: 'notice',
      text: 'A top knuckle is long on top, a bottom knuckle long underneath. Mark UP on the bar before it goes in the saw.',
      beside: 'longPointFace',
    },
    {
      signal: 'caution',
      text: 'Dry-fit on the stair before you weld out. The adopted local code and a licensed professional decide heights and loads.',
    },
  ],
  sources: [
    {
      says: 'The miter halves the angle between two bars of the same depth.',
      where: 'common practice (geometry), no published source',
    },
  ],
  related: ['pitch', 'long-short-point', 'saw-dial', 'handrail'],
  basis: 'common practice (geometry)',
})
