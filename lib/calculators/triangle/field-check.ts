import { fieldCheck } from '@/lib/trade/field-check'
import { defineCalculator } from '../define'
import { degrees, inches } from '../fields'
import { onTape, toDecimals, words } from '../outputs'

const tape = { above: 0, most: 12_000 } as const

/** Three tapes and the angle finder against each other. Inches and degrees. */
export const fieldCheckEntry = defineCalculator({
  id: 'field-check',
  revision: 1,
  stage: 'triangle',
  name: 'Field closing check',
  asks: 'Do my three tapes and the angle finder agree?',
  lede: 'Before you leave the site: three tapes must close into one triangle, and the angle finder must say the same.',
  alsoCalled: ['closing error', 'check measure', 'angle finder', 'does it close', 'verify', 'digital level'],
  example: { rise: '84', run: '132', rake: '156 1/2', angleFinder: '32.5' },
  inputs: {
    rise: inches('Rise', { ...tape, symbol: 'R' }),
    run: inches('Run', { ...tape, symbol: 'N', hint: 'Level, by plumb bob or laser.' }),
    rake: inches('Rake', { ...tape, symbol: 'K' }),
    angleFinder: degrees('Angle finder', { least: 0, most: 90, sane: [1, 60], hint: 'From level.', symbol: 'a' }),
  },
  outputs: {
    pitchFromTape: toDecimals('Pitch by rise and run', 'deg', 2, { symbol: 'p' }),
    closingError: toDecimals('The tapes close by', 'in', 3, { hint: '+ when the rake reads short' }),
    angleFinderError: toDecimals('The finder is off by', 'deg', 2, { hint: '+ when it reads steep' }),
    driftAtEnd: onTape('Off at the far end', { hint: 'if you trusted the finder' }),
    verdict: words('Verdict'),
    pitchFromRiseRake: toDecimals('Pitch by rise and rake', 'deg', 2),
  },
  answer: 'verdict',
  exactAnswer: 'closingError',
  glance: ['verdict', 'closingError', 'angleFinderError', 'driftAtEnd'],
  solve: fieldCheck,
  shown: {
    pitchFromTape: { says: 'Pitch from the two tapes that are least touchy.', formula: 'atan(rise / run)' },
    closingError: {
      says: 'The rake that rise and run ask for, less the rake you taped.',
      formula: 'sqrt(rise^2 + run^2) - rake',
    },
    angleFinderError: { says: 'The finder less the tape.', formula: 'angleFinder - pitchFromTape' },
    driftAtEnd: { says: 'How far that carries the far end off.', formula: 'rake * sin(angleFinderError)' },
    pitchFromRiseRake: { says: 'The same pitch from rise and rake.', formula: 'asin(rise / rake)' },
  },
  steps: (_given, { verdict }) => [
    { says: 'Accept 1/8 in on the tapes and 1/2° on the finder; past either, say which to doubt.', value: verdict },
  ],
  cautions: [
    { signal: 'caution', text: '1° over 14 ft is 3 in at the far end.', beside: 'angleFinderError' },
    {
      signal: 'notice',
      text: 'Run needs a plumb bob or a laser. Level your straightedge before you read it.',
      beside: 'run',
    },
  ],
  sources: [
    { says: 'Three sides of a right triangle close by the square of the sides.', where: 'common practice (geometry)' },
  ],
  related: ['pitch', 'nosing-line', 'handrail'],
  basis: 'common practice (geometry)',
})
