import { cutList } from '@/lib/trade/cut-list/cut-list'
import { defineCalculator } from '../define'
import { inches, list } from '../fields'
import { flag, listOf, onTape, shapeOf, toDecimals } from '../outputs'

/** Fewest sticks for pieces of these overall lengths. Inches. */
export const cutListEntry = defineCalculator({
  id: 'cut-list',
  revision: 1,
  stage: 'cutting',
  name: 'Cut list with kerf and nest',
  asks: 'How many sticks?',
  lede: 'Overall lengths, tip to tip. The fewest sticks that can do, what goes in each, and what is left to rack.',
  alsoCalled: [
    'nesting',
    'bar layout',
    'stock list',
    'cutting list',
    'offcuts',
    'drops',
    'how many lengths',
    'optimise',
    'sticks',
  ],
  example: { pieces: ['169 1/2', '60', '60', '48'], stock: '240', kerf: '1/16', trim: '1/2' },
  inputs: {
    pieces: list('Pieces, overall', inches('Piece', { above: 0, most: 12_000 }), { least: 1, most: 300 }),
    stock: inches('Stick length', { above: 0, most: 12_000, sane: [120, 480], hint: '240, 252 and 288 in are usual.' }),
    kerf: inches('Kerf', { least: 0, most: 2, sane: [0.035, 0.125] }),
    trim: inches('Trim', { least: 0, most: 240, fallback: 0, hint: 'Cut off a stick before you start.' }),
  },
  outputs: {
    sticks: toDecimals('Sticks', 'none', 0),
    bars: listOf('Bars', listOf('Bar', onTape('Piece'))),
    drops: listOf('Drops', onTape('Drop')),
    yieldPct: toDecimals('Used', '%', 1),
    bound: toDecimals('No fewer than', 'none', 0),
    proved: flag('Proved the fewest'),
    at: shapeOf('Places of the pieces in the list'),
  },
  answer: 'sticks',
  glance: ['sticks', 'yieldPct', 'bound', 'proved'],
  solve: cutList,
  steps: (_given, { sticks, bound, proved }) => [
    { says: 'Big pieces rule out some company: no fewer sticks than this can do.', value: String(bound) },
    {
      says: proved
        ? 'Found a layout with that many, so no fewer can do.'
        : 'Best layout found; fewer are not ruled out.',
      value: String(sticks),
    },
  ],
  cautions: [
    {
      signal: 'notice',
      text: 'Use overall lengths, long point to long point along the stock, not edges.',
      beside: 'pieces',
    },
    {
      signal: 'notice',
      text: 'Neighbours with parallel miters share a cut and save one setback. The sticks here are counted without that.',
      beside: 'bars',
    },
    { signal: 'notice', text: 'Mark each drop with its length and rack it.', beside: 'drops' },
    {
      signal: 'notice',
      text: 'Buy one spare stick on molded cap: a spoiled one cannot be matched later.',
      beside: 'sticks',
    },
  ],
  sources: [
    {
      says: 'Pieces fit when their sum with a kerf between neighbours is at most the usable length.',
      where: 'common practice, no published source',
    },
  ],
  related: ['long-short-point', 'handrail'],
  basis: 'common practice (geometry)',
})
