import { refuse } from '@/lib/trade/refusal'
import { mmPerInch } from '@/lib/trade/quantity/metric'
import { showTape } from '@/lib/trade/quantity/tape'
import { defineCalculator } from '../define'
import { choice, inches, readersTape } from '../fields'
import { onTape, toDecimals, words } from '../outputs'

/** The longest tape people read, in inches: 80 ft. */
const longestTape = 960

/** A length as the tape shows it: nearest mark, what the rounding costs, millimetres. */
export const tapeMath = defineCalculator({
  id: 'tape-math',
  revision: 1,
  stage: 'triangle',
  name: 'Tape and fraction converter',
  asks: 'What is this on my tape?',
  lede: 'Type a decimal, millimetres or feet and inches. The nearest mark on your tape follows, and what the rounding costs.',
  alsoCalled: [
    'fraction',
    'decimal to fraction',
    'mm to inches',
    'inches to mm',
    'sixteenths',
    'convert',
    'tape measure',
  ],
  example: { decimalIn: '143.3527' },
  inputs: {
    decimalIn: inches('Length', { least: -12_000, most: 12_000, sane: [1 / 16, longestTape], symbol: 'x' }),
    den: choice('Marks to the inch', [8, 16, 32, 64], {
      fallback: readersTape,
      names: ['1/8', '1/16', '1/32', '1/64'],
    }),
  },
  outputs: {
    nearest: onTape('Nearest mark', { symbol: 'x_{tape}' }),
    text: words('On the tape'),
    roundingError: toDecimals('The rounding costs', 'in', 4, { hint: '+ when the mark is long', symbol: 'e' }),
    mm: toDecimals('Millimetres', 'mm', 1),
  },
  answer: 'nearest',
  exactAnswer: 'mm',
  glance: ['text', 'mm', 'roundingError'],
  solve({ decimalIn, den }) {
    if (Math.abs(decimalIn) > 12_000) return refuse('decimalIn', 'That is longer than any tape: at most 1,000 ft.')
    const nearest = Math.sign(decimalIn) * (Math.round(Math.abs(decimalIn) * den) / den)
    return { nearest, text: showTape(nearest, den), roundingError: nearest - decimalIn, mm: decimalIn * mmPerInch }
  },
  precisionOf: ({ den }, asked) => ({ ...asked, tape: den }),
  warn: (_given, { roundingError }) =>
    Math.abs(roundingError) > 1 / 32 + 1e-9
      ? [{ field: 'den', message: 'Rounding costs more than 1/32 in here: read a finer mark.' }]
      : [],
  shown: {
    nearest: {
      says: 'Count the marks, round to a whole one, count back. Minus lengths round the same way as plus.',
      formula: 'sign(decimalIn) * round(abs(decimalIn) * den) / den',
    },
    roundingError: { says: 'The mark less the true length.', formula: 'nearest - decimalIn' },
    mm: { says: 'An inch is 25.4 mm exactly.', formula: 'decimalIn * 25.4' },
  },
  cautions: [
    {
      signal: 'caution',
      text: 'Round once, at the end. A rounded number used again carries its rounding along.',
      beside: 'nearest',
    },
    { signal: 'notice', text: '5.3 ft is not 5′ 3″: a tenth of a foot is 1 3/16 in.', beside: 'decimalIn' },
  ],
  sources: [
    { says: 'One inch is 25.4 mm exactly.', where: 'International yard and pound agreement of 1959, from memory' },
  ],
  related: ['pitch', 'cut-list', 'long-short-point'],
  basis: 'exact (25.4 mm/in)',
})
