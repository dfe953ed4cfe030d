import { nosingLine } from '@/lib/trade/nosing-line'
import { defineCalculator } from '../define'
import { inches, whole } from '../fields'
import { onTape, toDecimals } from '../outputs'

/** What the tape should read along the nosings, from a count of risers. Inches. */
export const nosingLineEntry = defineCalculator({
  id: 'nosing-line',
  revision: 1,
  stage: 'field',
  name: 'Nosing line from riser count',
  asks: 'What should my tape read nosing to nosing?',
  lede: 'Count the risers, measure one step. The whole nosing line follows; tape it to see whether the stair is even.',
  alsoCalled: ['stringer', 'stair length', 'rake length', 'risers', 'treads', 'going', 'total rise', 'flight'],
  example: { risers: '13', rise: '7', run: '11' },
  inputs: {
    risers: whole('Risers', {
      least: 2,
      most: 200,
      sane: [2, 20],
      hint: 'Every riser, the one up to the landing too.',
      symbol: 'n',
    }),
    rise: inches('Rise of one step', { above: 0, most: 240, sane: [4, 9.5], symbol: 'r' }),
    run: inches('Run of one step', {
      above: 0,
      most: 240,
      sane: [9, 14],
      hint: 'Nosing to nosing, level.',
      symbol: 't',
    }),
  },
  outputs: {
    pitch: toDecimals('Pitch', 'deg', 2),
    rakeNosingToNosing: onTape('Rake, nosing to nosing', { hint: 'bottom nosing to top nosing' }),
    runNosingToNosing: onTape('Run, nosing to nosing'),
    totalRise: onTape('Total rise', { hint: 'floor to upper floor' }),
    unitRake: onTape('Rake of one step', { symbol: 'k' }),
    riseNosingToNosing: onTape('Rise, nosing to nosing'),
  },
  answer: 'rakeNosingToNosing',
  glance: ['rakeNosingToNosing', 'pitch', 'runNosingToNosing', 'riseNosingToNosing'],
  solve: nosingLine,
  shown: {
    pitch: { says: 'Rise over run of one step.', formula: 'atan(rise / run)' },
    unitRake: { says: 'One step along the slope.', formula: 'sqrt(rise^2 + run^2)' },
    rakeNosingToNosing: { says: 'So many risers make one step of rake less.', formula: '(risers - 1) * unitRake' },
    runNosingToNosing: { says: 'The same for the run.', formula: '(risers - 1) * run' },
    riseNosingToNosing: { says: 'And for the rise between the end nosings.', formula: '(risers - 1) * rise' },
    totalRise: { says: 'The whole stair climbs every riser.', formula: 'risers * rise' },
  },
  cautions: [
    {
      signal: 'notice',
      text: 'N risers make N − 1 steps of rake: the first nosing already stands one rise up.',
      beside: 'risers',
    },
    {
      signal: 'notice',
      text: 'No nosing on an open or first tread: hook the tape on the edge people step on, and say so on the sheet.',
      beside: 'rakeNosingToNosing',
    },
  ],
  sources: [{ says: 'Steps counted along the nosings.', where: 'common practice (geometry)' }],
  related: ['field-check', 'pitch', 'knuckle-height', 'handrail'],
  basis: 'common practice (geometry)',
})
