import type { Drawing, LabelRequest, Show, Spot, Stroke } from '@/lib/drawing/sketch'
import { nudged, outline, path, spot, toward } from '@/lib/drawing/strokes'
import { degrees, dial, number, plain, word } from '@/lib/drawing/text'
import type { SawDialAnswer } from '@/lib/trade/saw-dial'

interface Given {
  fromSquare: number
  sawMax: number
}

/** The saw from above in inches of its own: only the angles are true. */
const stockDepth = 2.2
const stockReach = 9
const innerRadius = 6
const outerRadius = 7.1

/** Down the page is square to the fence; the blade swings to the right. */
const way = (fromSquare: number) => -90 + fromSquare
const onDialAt = (fromSquare: number, radius: number): Spot => toward(spot(0, 0), way(fromSquare), radius)

/** Vice and blade from above, both scales of the dial. */
export const draw: Drawing<Given, SawDialAnswer> = (given, solved, show) => {
  // Past its range the stock is turned a quarter, and the saw is set to what is left.
  const setting = solved.overRange ? (solved.ifOverRange ?? given.sawMax) : solved.squareIs0
  const last = Math.max(45, Math.ceil(Math.max(given.sawMax, setting) / 5) * 5)
  return {
    strokes: [
      path('post', [spot(-stockReach, 0.12), spot(stockReach, 0.12)]),
      ...stockStrokes(solved.overRange),
      ...scaleStrokes(last),
      path('cut', [toward(spot(0, 0), way(setting) + 180, 1.8), onDialAt(setting, outerRadius + 1)]),
    ],
    labels: labelsOf(given, solved, show, setting, last),
    says: saysOf(given, solved, show),
  }
}

function stockStrokes(overRange: boolean): Stroke[] {
  if (!overRange)
    return [
      outline(
        'object',
        [
          spot(-stockReach, -0.1),
          spot(stockReach, -0.1),
          spot(stockReach, -stockDepth),
          spot(-stockReach, -stockDepth),
        ],
        'face',
      ),
    ]
  const half = stockDepth / 2
  return [
    outline(
      'ghost',
      [spot(-half - 3, -0.1), spot(-half - 0.1, -0.1), spot(-half - 0.1, -4.6), spot(-half - 3, -4.6)],
      'face',
    ),
    outline('object', [spot(-half, -0.1), spot(half, -0.1), spot(half, -5.2), spot(-half, -5.2)], 'face'),
  ]
}

function scaleStrokes(last: number): Stroke[] {
  const arc = (radius: number): Stroke => ({
    kind: 'arc',
    centre: spot(0, 0),
    radius: { inches: radius },
    from: way(-last),
    to: way(last),
    ink: 'dim',
  })
  const ticks: Stroke[] = []
  for (let mark = -last; mark <= last; mark += 5) {
    const long = mark % 15 === 0 ? 0.5 : 0.28
    ticks.push(path('dim', [onDialAt(mark, innerRadius), onDialAt(mark, innerRadius - long)]))
    ticks.push(path('dim', [onDialAt(mark, outerRadius), onDialAt(mark, outerRadius + long)]))
  }
  return [arc(innerRadius), arc(outerRadius), ...ticks]
}

function labelsOf(given: Given, solved: SawDialAnswer, show: Show, setting: number, last: number): LabelRequest[] {
  const end = onDialAt(setting, outerRadius + 1)
  const marks: LabelRequest[] = []
  for (let mark = -last; mark <= last; mark += 15) {
    const out = way(mark)
    const shown = { size: 'note', required: false, worth: 1, reach: 8, leader: false } as const
    marks.push({
      ...shown,
      kind: 'at',
      text: [[number(String(Math.abs(mark)), 'quiet')]],
      spot: onDialAt(mark, innerRadius - 0.5),
      prefer: [out + 180],
      gap: 4,
    })
    marks.push({
      ...shown,
      kind: 'at',
      text: [[number(String(90 - Math.abs(mark)), 'quiet')]],
      spot: onDialAt(mark, outerRadius + 0.5),
      prefer: [out],
      gap: 4,
    })
  }
  return [
    {
      kind: 'at',
      text: readingText(solved, show),
      size: 'answer',
      spot: end,
      prefer: [way(setting), -60, -30, -90, 0],
      gap: 6,
      required: true,
    },
    ...marks,
    {
      kind: 'along',
      text: [[word('fence')]],
      size: 'note',
      from: spot(-stockReach, 0.3),
      to: spot(-2, 0.3),
      side: 'above',
      gap: 6,
      required: false,
    },
    ...(solved.overRange
      ? [
          {
            kind: 'at',
            text: [[word('squared block')]],
            size: 'note',
            spot: spot(-stockDepth / 2 - 3, -2.4),
            prefer: [180, 150, -150],
            gap: 8,
            required: true,
          } as const,
        ]
      : [
          {
            kind: 'along',
            text: [[word('stock')]],
            size: 'note',
            from: spot(-stockReach, -stockDepth / 2),
            to: spot(-3, -stockDepth / 2),
            side: 'within',
            required: false,
          } as const,
        ]),
    {
      kind: 'at',
      text: [[word('0 and 90 are square')]],
      size: 'note',
      spot: nudged(onDialAt(0, outerRadius + 0.5), -90, 18),
      prefer: [-90, -120, -150, 180],
      gap: 6,
      required: false,
    },
    ...overLabel(given, solved),
  ]
}

function readingText(solved: SawDialAnswer, show: Show) {
  if (solved.overRange && solved.ifOverRange !== null)
    return [[word('set ', 'cut'), ...dial(solved.ifOverRange, show, 'cut')], [word('off the turned stock')]]
  return [
    [word('reads ', 'cut'), ...dial(solved.squareIs0, show, 'cut')],
    [word('or '), ...dial(solved.squareIs90, show, 'quiet'), word(' where square reads 90')],
  ]
}

function overLabel({ fromSquare, sawMax }: Given, { overRange }: SawDialAnswer): LabelRequest[] {
  if (!overRange) return []
  return [
    {
      kind: 'at',
      text: [[...degrees(fromSquare, 2), word(' is past this saw’s '), ...degrees(sawMax, 1)]],
      size: 'note',
      spot: spot(stockDepth / 2, -3),
      prefer: [0, 20],
      gap: 60,
      reach: 160,
      required: false,
      leader: false,
    },
  ]
}

function saysOf({ fromSquare, sawMax }: Given, solved: SawDialAnswer, show: Show): string {
  if (solved.overRange && solved.ifOverRange !== null) {
    return `The saw from above. ${plain([degrees(fromSquare, 2)])} is past its ${plain([degrees(sawMax, 1)])}: turn the stock a quarter against a squared block and set ${plain([dial(solved.ifOverRange, show)])}.`
  }
  return `The saw from above, blade ${plain([degrees(fromSquare, 2)])} off square: the dial reads ${plain([dial(solved.squareIs0, show)])} where square is 0, and ${plain([dial(solved.squareIs90, show)])} where square is 90.`
}
