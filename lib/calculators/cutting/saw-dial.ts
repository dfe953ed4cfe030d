import { sawDial } from '@/lib/trade/saw-dial'
import { defineCalculator, type Shown } from '../define'
import { choice, degrees, readersDial } from '../fields'
import { flag, onDial } from '../outputs'

/** What a saw reads for a cut so far off square. Degrees. */
export const sawDialEntry = defineCalculator({
  id: 'saw-dial',
  revision: 1,
  stage: 'cutting',
  name: 'Saw dial converter',
  asks: 'What does MY saw read?',
  lede: 'Some saws call a square cut 0, others 90. Give the cut off square; both readings follow, and what to do past the end of the swing.',
  alsoCalled: ['chop saw', 'cold saw', 'band saw', 'dial', 'protractor', 'complement', 'square is 90', 'swing'],
  example: { fromSquare: '16.24', sawMax: '45' },
  inputs: {
    fromSquare: degrees('Cut, off square', { least: 0, most: 90, hint: '0 is square across.', symbol: 'a' }),
    sawMax: degrees('The saw swings to', { above: 0, most: 90, fallback: 45 }),
    step: choice('Finest step of the dial', [0.25, 0.5, 1], { fallback: readersDial, names: ['1/4°', '1/2°', '1°'] }),
  },
  outputs: {
    squareIs0: onDial('Reads, 0 is square'),
    squareIs90: onDial('Reads, 90 is square'),
    overRange: flag('Past the swing'),
    ifOverRange: onDial('With the stock turned', { hint: 'stock laid 90° to the fence on a squared block' }),
  },
  answer: 'squareIs0',
  glance: ['squareIs0', 'squareIs90', 'overRange', 'ifOverRange'],
  solve: sawDial,
  precisionOf: ({ step }, asked) => ({ ...asked, dial: step }),
  shown: ({ sawMax }, { ifOverRange }): Shown => ({
    squareIs0: { says: 'Nearest mark of the dial.', formula: 'round(fromSquare / step) * step' },
    squareIs90: { says: 'A saw that calls square 90 reads what is left of 90.', formula: '90 - squareIs0' },
    ...(ifOverRange === null
      ? {}
      : {
          ifOverRange: {
            says: `Past the ${sawMax}° of this saw: clamp a squared block and cut the rest of 90, to the nearest mark.`,
            formula: 'round((90 - fromSquare) / step) * step',
          },
        }),
  }),
  cautions: [
    {
      signal: 'warning',
      text: 'Stock laid across the fence wants to roll and grab. Clamp stock and block both, blade stopped, before you cut.',
      beside: 'ifOverRange',
      when: (_given, { overRange }) => overRange,
    },
    {
      signal: 'notice',
      text: 'Check a square cut first, then cut two scrap miters and close them on a known flat.',
      beside: 'squareIs0',
    },
    { signal: 'notice', text: 'The dial is never the truth. The protractor on the part is.' },
  ],
  sources: [{ says: 'The two scales add up to 90.', where: 'common practice (geometry)' }],
  related: ['miter', 'long-short-point'],
  basis: 'common practice (geometry)',
})
