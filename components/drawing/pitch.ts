import type { Drawing, LabelRequest, Show } from '@/lib/drawing/sketch'
import { angleArc, nudged, outline, path, spot } from '@/lib/drawing/strokes'
import { degrees, length, number, plain, word } from '@/lib/drawing/text'
import type { PitchAnswer } from '@/lib/trade/pitch'

/** Wider than this the triangle spans a whole flight, whose treads were not counted. */
const oneTread = 24

/** Px on paper. */
const arcRadius = ({ detail }: Show) => (detail === 'full' ? 92 : 52)

/** A right triangle laid on the nosing line: rise, run and rake of the very numbers. */
export const draw: Drawing<Record<string, unknown>, PitchAnswer> = (_given, solved, show) => {
  const { rise, run, pitch } = solved
  const radius = arcRadius(show)
  const before =
    run <= oneTread && show.detail === 'full'
      ? [
          path('ghost', [spot(-0.5 * run, -rise), spot(0, -rise), spot(0, 0)]),
          path('ghost', [spot(run, rise), spot(1.5 * run, rise)]),
        ]
      : []
  return {
    strokes: [
      ...before,
      outline('object', [spot(0, 0), spot(run, 0), spot(run, rise)], 'face'),
      path('dim', [spot(run, 0, -14, 0), spot(run, 0, -14, 14), spot(run, 0, 0, 14)], { passable: true }),
      ...(pitch > 0.5 ? [angleArc(spot(0, 0), radius, 0, pitch)] : []),
    ],
    labels: labelsOf(solved, show),
    says: `Rise ${plain([length(rise, show)])}, run ${plain([length(run, show)])}, rake ${plain([length(solved.rake, show)])}: pitch ${plain([degrees(pitch, 2)])}, ${solved.inPer12.toFixed(2)} in 12.`,
  }
}

function labelsOf({ rise, run, rake, pitch, inPer12 }: PitchAnswer, show: Show): LabelRequest[] {
  const corner = spot(run, rise)
  return [
    {
      kind: 'dimension',
      text: [[...length(rake, show), word(' rake')]],
      size: 'number',
      from: spot(0, 0),
      to: corner,
      side: 'left',
      offset: 30,
      required: true,
    },
    {
      kind: 'dimension',
      text: [[...length(rise, show), word(' rise')]],
      size: 'number',
      from: spot(run, 0),
      to: corner,
      side: 'right',
      offset: 30,
      required: true,
    },
    {
      kind: 'dimension',
      text: [[...length(run, show), word(' run')]],
      size: 'number',
      from: spot(0, 0),
      to: spot(run, 0),
      side: 'right',
      offset: 30,
      required: true,
    },
    {
      kind: 'at',
      size: 'answer',
      required: true,
      gap: 10,
      text: [degrees(pitch, 2, 'cut'), [number(inPer12.toFixed(2), 'quiet'), word(' in 12')]],
      spot: nudged(spot(0, 0), pitch / 2, arcRadius(show)),
      prefer: [pitch / 2, 0, -30, -90],
    },
  ]
}
