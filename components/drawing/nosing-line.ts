import type { Drawing, LabelRequest, Show } from '@/lib/drawing/sketch'
import { angleArc, nudged, path, spot } from '@/lib/drawing/strokes'
import { degrees, length, number, plain, word } from '@/lib/drawing/text'
import type { NosingLine } from '@/lib/trade/nosing-line'
import { steps } from './steps'

interface Given {
  risers: number
  rise: number
  run: number
}

/** The flight with its nosings numbered, and the tape from the first to the last. */
export const draw: Drawing<Given, NosingLine> = (given, solved, show) => {
  const { risers, rise, run } = given
  const top = spot(solved.runNosingToNosing, solved.riseNosingToNosing)
  const profile = [spot(-run * 1.4, -rise), ...steps({ x: 0, y: 0 }, risers, rise, run)]
  return {
    strokes: [
      path('object', profile),
      path('cut', [spot(0, 0), top]),
      ...(show.detail === 'full'
        ? [path('ext', [spot(0, 0, 6), spot(0, 0, 108)]), angleArc(spot(0, 0), 88, 0, solved.pitch)]
        : []),
    ],
    labels: labelsOf(given, solved, show),
    says: `A flight of ${risers} risers, ${plain([length(rise, show)])} by ${plain([length(run, show)])}: nosing 1 to nosing ${risers} is ${plain([length(solved.rakeNosingToNosing, show)])} along the rake in ${risers - 1} steps, ${plain([length(solved.runNosingToNosing, show)])} level, ${plain([length(solved.riseNosingToNosing, show)])} plumb. Pitch ${plain([degrees(solved.pitch, 2)])}.`,
  }
}

function labelsOf({ risers, rise, run }: Given, solved: NosingLine, show: Show): LabelRequest[] {
  const full = show.detail === 'full'
  const top = spot(solved.runNosingToNosing, solved.riseNosingToNosing)
  const nosings = Array.from({ length: risers }, (_, i) => i)
  return [
    {
      kind: 'dimension',
      text: [
        [
          ...length(solved.rakeNosingToNosing, show, 'cut'),
          word(` in ${risers - 1} ${risers === 2 ? 'step' : 'steps'}`),
        ],
      ],
      size: 'answer',
      from: spot(0, 0),
      to: top,
      side: 'left',
      offset: 34,
      required: true,
    },
    {
      kind: 'dimension',
      text: [length(solved.riseNosingToNosing, show)],
      size: 'number',
      from: spot(top.x + run, 0),
      to: spot(top.x + run, top.y),
      side: 'right',
      offset: 22,
      required: full,
    },
    {
      kind: 'dimension',
      text: [length(solved.runNosingToNosing, show)],
      size: 'number',
      from: spot(0, -rise),
      to: spot(top.x, -rise),
      side: 'right',
      offset: 26,
      required: full,
    },
    ...(full
      ? [
          {
            kind: 'at',
            text: [degrees(solved.pitch, 2)],
            size: 'number',
            required: true,
            gap: 8,
            spot: nudged(spot(0, 0), solved.pitch / 2, 88),
            prefer: [solved.pitch / 2, 0, -45],
          } as const,
        ]
      : []),
    ...nosings.map((i): LabelRequest => {
      const isEnd = i === 0 || i === risers - 1
      return {
        kind: 'at',
        text: [[number(String(i + 1), isEnd ? 'text' : 'quiet')]],
        size: 'note',
        required: isEnd,
        worth: 0.5,
        spot: spot(i * run, i * rise),
        prefer: isEnd ? [135, 110, 160, -45, 90, 180] : [-45, -30, -60],
        gap: 5,
        reach: isEnd ? 60 : 8,
        leader: isEnd,
      }
    }),
  ]
}
