import type { Drawing, LabelRequest, Show, Stroke } from '@/lib/drawing/sketch'
import { outline, path, spot } from '@/lib/drawing/strokes'
import { length, number, plain, word } from '@/lib/drawing/text'

interface Given {
  decimalIn: number
  den: number
}
interface Solved {
  nearest: number
  roundingError: number
  mm: number
}

/** Px of the strip, and of a graduation by its own denominator: the eye finds a half by its length. */
const stripHeight = 84
const graduations = { 1: 54, 2: 40, 4: 31, 8: 24, 16: 17, 32: 12, 64: 8 }
const halfWindow = 8

/** A strip of tape with the nearest mark, its two neighbours, and where the decimal really falls. */
export const draw: Drawing<Given, Solved> = (given, solved, show) => {
  const { den } = given
  const read: Show = { ...show, metric: false, tape: tapeOf(den) }
  const first = Math.max(0, solved.nearest - halfWindow / den)
  const last = first + (2 * halfWindow) / den
  const marks: Stroke[] = []
  for (let k = Math.ceil(first * den - 1e-9); k <= last * den + 1e-9; k++) marks.push(markAt(k, den))
  const isExact = Math.abs(given.decimalIn - solved.nearest) < 1e-6
  return {
    strokes: [
      outline(
        'tape',
        [spot(first, 0, -14), spot(last, 0, 14), spot(last, 0, 14, -stripHeight), spot(first, 0, -14, -stripHeight)],
        'tape',
        { passable: true },
      ),
      shade(solved.nearest, den),
      ...marks,
      ...[solved.nearest - 1 / den, solved.nearest + 1 / den]
        .filter((x) => x >= 0)
        .map((x) => path('ext', [spot(x, 0, 0, -graduations[1] - 4), spot(x, 0, 0, -stripHeight - 18)])),
      path('cut', [spot(given.decimalIn, 0, 0, 34), spot(given.decimalIn, 0, 0, 0)]),
    ],
    labels: labelsOf(given, solved, read, { first, last, isExact }),
    says: `${given.decimalIn} in on a tape: nearest mark ${plain([length(solved.nearest, read)])}, between ${plain([length(solved.nearest - 1 / den, read)])} and ${plain([length(solved.nearest + 1 / den, read)])}. ${solved.mm.toFixed(1)} mm.`,
  }
}

/** The nearest mark stands in a shadow of its own. */
function shade(x: number, den: number): Stroke {
  const half = 0.42 / den
  return outline(
    'tape',
    [spot(x - half, 0), spot(x + half, 0), spot(x + half, 0, 0, -stripHeight), spot(x - half, 0, 0, -stripHeight)],
    'shade',
    { passable: true },
  )
}

function tapeOf(den: number): Show['tape'] {
  return den === 8 || den === 32 || den === 64 ? den : 16
}

type Division = keyof typeof graduations

/** The largest division a mark belongs to: 8/16 is a half. */
function ownDenominator(k: number, den: number): Division {
  let [n, d] = [k, den]
  while (d > 1 && n % 2 === 0) {
    n /= 2
    d /= 2
  }
  return isDivision(d) ? d : 16
}

const isDivision = (d: number): d is Division => d in graduations

function markAt(k: number, den: number): Stroke {
  const height = graduations[ownDenominator(k, den)]
  return path('tape', [spot(k / den, 0, 0, -1), spot(k / den, 0, 0, -height)])
}

function labelsOf(
  { decimalIn, den }: Given,
  { nearest, roundingError }: Solved,
  read: Show,
  at: { first: number; last: number; isExact: boolean },
): LabelRequest[] {
  const labels: LabelRequest[] = [
    {
      kind: 'at',
      size: 'answer',
      required: true,
      gap: 6,
      spot: spot(decimalIn, 0, 0, 34),
      prefer: [90, 45, 135],
      reach: 10,
      leader: false,
      text: [
        length(nearest, read, 'cut'),
        [
          number(decimalText(decimalIn), 'quiet'),
          word(at.isExact ? ' in, on the mark' : ` in, off by ${Math.abs(roundingError).toFixed(4)}`),
        ],
      ],
    },
  ]
  for (let inch = Math.ceil(at.first - 1e-9); inch <= at.last + 1e-9; inch++) {
    labels.push({
      kind: 'at',
      text: [[number(String(inch), 'on-tape')]],
      size: 'number',
      spot: spot(inch, 0, 0, -56),
      prefer: [-90, -45, -135],
      gap: 3,
      reach: 8,
      required: false,
      leader: false,
    })
  }
  for (const [side, value] of [
    [-120, nearest - 1 / den],
    [-60, nearest + 1 / den],
  ] as const) {
    if (value < 0) continue
    labels.push({
      kind: 'at',
      text: [length(value, read)],
      size: 'number',
      spot: spot(value, 0, 0, -stripHeight - 18),
      prefer: [side, -90],
      gap: 5,
      reach: 30,
      required: true,
    })
  }
  return labels
}

const decimalText = (value: number) => String(Number(value.toFixed(4)))
