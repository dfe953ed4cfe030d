import { knuckles } from '@/lib/trade/knuckle'
import { defineCalculator, type Note, type Shown } from '../define'
import { degrees, inches } from '../fields'
import { onTape } from '../outputs'

const height = { above: 0, most: 240, sane: [34, 38] } as const

const farOff = (pastTopNosing: number): Note[] =>
  Math.abs(pastTopNosing) > 6
    ? [{ field: 'topLevelHeight', message: 'The top knuckle is more than 6 in off its nosing: check the two heights.' }]
    : []

/** The bottom knuckle needs both; with one alone nothing is guessed. */
function halfGiven(given: { bottomLevelHeight: number | null; firstRise: number | null }): Note[] {
  if ((given.bottomLevelHeight === null) === (given.firstRise === null)) return []
  return given.firstRise === null
    ? [{ field: 'firstRise', message: 'The bottom knuckle needs the first rise as well.' }]
    : [{ field: 'bottomLevelHeight', message: 'The bottom knuckle needs the height of the bottom run as well.' }]
}

/** Where the rake turns level, measured from the nosings. Degrees and inches. */
export const knuckleHeight = defineCalculator({
  id: 'knuckle-height',
  revision: 1,
  stage: 'field',
  name: 'Knuckle position and rail height consistency',
  asks: 'Where does the rake turn level?',
  lede: 'Rail heights on the rake and on the level runs decide where the knuckles stand. Equal heights put the top one plumb over its nosing.',
  alsoCalled: ['transition', 'easing', 'rail height', 'extension', 'where to bend', 'turn point'],
  example: { pitch: '32.5', rakeHeight: '36', topLevelHeight: '36', bottomLevelHeight: '36', firstRise: '7' },
  inputs: {
    pitch: degrees('Pitch', { above: 0, most: 89, sane: [20, 50], symbol: 'p' }),
    rakeHeight: inches('Height on the rake', { ...height, hint: 'Plumb, nosing to top of rail.' }),
    topLevelHeight: inches('Height of the top run', { ...height, hint: 'Plumb, landing to top of rail.' }),
    bottomLevelHeight: inches('Height of the bottom run', {
      ...height,
      fallback: null,
      hint: 'Leave empty when there is none.',
    }),
    firstRise: inches('First rise', { above: 0, most: 240, sane: [4, 9.5], fallback: null }),
  },
  outputs: {
    pastTopNosing: onTape('Top knuckle', { hint: 'past the top nosing; + is over the landing' }),
    beforeBottomNosing: onTape('Bottom knuckle', { hint: 'in front of the bottom nosing' }),
  },
  answer: 'pastTopNosing',
  glance: ['pastTopNosing', 'beforeBottomNosing'],
  solve: knuckles,
  warn: (given, { pastTopNosing }) => [...farOff(pastTopNosing), ...halfGiven(given)],
  shown: (_given, { beforeBottomNosing }): Shown => ({
    pastTopNosing: {
      says: 'What the level run stands higher, laid along the pitch.',
      formula: '(topLevelHeight - rakeHeight) / tan(pitch)',
    },
    ...(beforeBottomNosing === null
      ? {}
      : {
          beforeBottomNosing: {
            says: 'The first rise and the difference of heights, laid along the pitch.',
            formula: '(firstRise + rakeHeight - bottomLevelHeight) / tan(pitch)',
          },
        }),
  }),
  cautions: [
    { signal: 'notice', text: 'Heights are plumb, from the nosing to the TOP of the rail.', beside: 'rakeHeight' },
    { signal: 'caution', text: 'An inch of height moves the knuckle about 1 1/2 in at 32°.', beside: 'pastTopNosing' },
    {
      signal: 'warning',
      text: 'Rail height is a matter of the adopted local code; a licensed professional decides.',
      beside: 'topLevelHeight',
    },
  ],
  sources: [
    {
      says: 'Two lines at different heights cross where their difference is used up by the pitch.',
      where: 'common practice (geometry)',
    },
  ],
  related: ['handrail', 'miter', 'pitch'],
  basis: 'common practice (geometry)',
})
