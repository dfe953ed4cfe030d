import { pitchFrom } from '@/lib/trade/pitch'
import { defineCalculator, type Shown } from '../define'
import { inches } from '../fields'
import { onTape, toDecimals } from '../outputs'

const tape = { least: 0, most: 12_000, fallback: null } as const

const fromTwoLegs: Shown = {
  pitch: { says: 'Rise over run is the tangent of the pitch.', formula: 'atan(rise / run)' },
  rake: { says: 'The rake closes the triangle.', formula: 'sqrt(rise^2 + run^2)' },
}
const fromRise: Shown = {
  pitch: { says: 'Rise over rake is the sine of the pitch.', formula: 'asin(rise / rake)' },
  run: { says: 'The run closes the triangle.', formula: 'sqrt(rake^2 - rise^2)' },
}
const fromRun: Shown = {
  pitch: { says: 'Run over rake is the cosine of the pitch.', formula: 'acos(run / rake)' },
  rise: { says: 'The rise closes the triangle.', formula: 'sqrt(rake^2 - run^2)' },
}
const perTwelve: Shown = { inPer12: { says: 'On a framing square: rise in 12 of run.', formula: '12 * tan(pitch)' } }

/** Pitch from any two of rise, run and rake. Inches in, degrees and inches out. */
export const pitch = defineCalculator({
  id: 'pitch',
  revision: 1,
  stage: 'triangle',
  name: 'Pitch from any two of rise, run, rake',
  asks: 'What pitch am I on?',
  lede: 'Tape two sides of the nosing triangle and leave the third empty. Rise and run beat rake and run.',
  alsoCalled: ['angle', 'slope', 'stair angle', 'rise over run', 'going', 'incline', 'degrees', 'rake angle'],
  example: { rise: '7', run: '11' },
  inputs: {
    rise: inches('Rise', { ...tape, symbol: 'R' }),
    run: inches('Run', { ...tape, hint: 'Nosing to nosing, level; not the tread with its nosing.', symbol: 'N' }),
    rake: inches('Rake', { ...tape, hint: 'Along the slope, nosing to nosing.', symbol: 'K' }),
  },
  outputs: {
    pitch: toDecimals('Pitch', 'deg', 2, { symbol: 'p' }),
    inPer12: toDecimals('On the square', 'in/12', 3),
    rake: onTape('Rake', { symbol: 'K' }),
    rise: onTape('Rise', { symbol: 'R' }),
    run: onTape('Run', { symbol: 'N' }),
  },
  answer: 'pitch',
  glance: ['pitch', 'inPer12', 'rake', 'rise', 'run'],
  solve: pitchFrom,
  warn: (_given, { pitch: found }) =>
    (found >= 20 && found <= 50) || (found >= 1.2 && found <= 4.8)
      ? []
      : [{ message: 'Stairs lie between 20° and 50°, ramps between 1.2° and 4.8°. Check the tapes.' }],
  shown: ({ rise, run }) => ({
    ...(rise !== null && run !== null ? fromTwoLegs : rise !== null ? fromRise : fromRun),
    ...perTwelve,
  }),
  cautions: [
    {
      signal: 'notice',
      text: 'Run is nosing to nosing. Tread depth with the nosing makes the pitch read flat.',
      beside: 'run',
    },
    {
      signal: 'caution',
      text: 'From rake and run a flat pitch is touchy: a sixteenth moves it a lot. Tape the rise if you can.',
      beside: 'rake',
      when: ({ rise }) => rise === null,
    },
  ],
  sources: [{ says: 'Right triangle: tangent, sine, cosine.', where: 'common practice (geometry)' }],
  related: ['miter', 'field-check', 'nosing-line', 'handrail'],
  basis: 'common practice (geometry)',
})
