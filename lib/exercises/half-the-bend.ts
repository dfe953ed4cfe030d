import { atanDeg } from '@/lib/trade/angles'
import { miterAt, type LongPointFace } from '@/lib/trade/miter'
import type { Exercise, Knuckle, Slip } from './exercise'
import { drawFlights, drawLevel, drawSaw } from './knuckle-givens'

type Saw = { sawAtSquare: 0 | 90 }
type Stair = Saw & { unitRise: number; unitRun: number }
type Bars = Saw & Knuckle
type Row = Saw & { knuckles: readonly Knuckle[] }

/** Neither the section nor the dial's step moves a miter or its face; any will do. */
const miterOf = ({ slopeBelow, slopeAbove }: Knuckle) => miterAt(slopeBelow, slopeAbove, 1, 0.25)

/** What the dial shows for a cut so many degrees off square. */
const onDial = ({ sawAtSquare }: Saw, offSquare: number) => Math.abs(sawAtSquare - offSquare)
const onOtherDial = ({ sawAtSquare }: Saw, offSquare: number) =>
  onDial({ sawAtSquare: sawAtSquare ? 0 : 90 }, offSquare)

const pitchOf = ({ unitRise, unitRun }: Stair) => atanDeg(unitRise, unitRun)
const topOf = (stair: Stair) => miterOf({ slopeBelow: pitchOf(stair), slopeAbove: 0 })

const bothClimb = ({ slopeBelow, slopeAbove }: Knuckle) => slopeBelow > 0 && slopeAbove > 0

/** Saw setting from unit rise and unit run, where a flight turns level at its top. */
export const sawSetting: Exercise<Stair> = {
  id: 'half-the-bend/saw-setting',
  revision: 1,
  kind: 'number',
  asks: 'The rail follows this stair and turns level at the top. What do you set the saw to for the knuckle?',
  gives: ['unitRise', 'unitRun', 'sawAtSquare'],
  drawGivens: (draws) => ({
    unitRise: draws.step(6.5, 7.75, 1 / 8),
    unitRun: draws.step(10, 12, 1 / 4),
    sawAtSquare: drawSaw(draws),
  }),
  parts: [
    {
      kind: 'number',
      asks: 'Saw setting',
      measure: 'angle',
      solve: (stair) => onDial(stair, topOf(stair).miter),
      slips: [
        { code: 'full-pitch', wrong: (stair) => onDial(stair, topOf(stair).bend) },
        { code: 'run-over-rise', wrong: (stair) => onDial(stair, (90 - topOf(stair).bend) / 2) },
        { code: 'wrong-dial', wrong: (stair) => onOtherDial(stair, topOf(stair).miter) },
        { code: 'halved-twice', wrong: (stair) => onDial(stair, topOf(stair).miter / 2) },
        { code: 'radians', wrong: (stair) => onDial(stair, Math.atan(stair.unitRise / stair.unitRun) / 2) },
      ],
    },
  ],
}

/** Slips of a saw setting between two read slopes. */
const settingSlips: readonly Slip<Bars, number>[] = [
  { code: 'full-pitch', wrong: (bars) => onDial(bars, miterOf(bars).bend) },
  // Between two flights both plumb readings differ by the same bend: no slip is left.
  { code: 'half-of-plumb', wrong: (bars) => (bothClimb(bars) ? null : onDial(bars, (90 - miterOf(bars).bend) / 2)) },
  { code: 'wrong-dial', wrong: (bars) => onOtherDial(bars, miterOf(bars).miter) },
  { code: 'halved-twice', wrong: (bars) => onDial(bars, miterOf(bars).miter / 2) },
  // Beside a level run the sum is the difference, and its half no slip.
  {
    code: 'added-pitches',
    wrong: (bars) => (bothClimb(bars) ? onDial(bars, (bars.slopeBelow + bars.slopeAbove) / 2) : null),
  },
  {
    code: 'averaged-pitches',
    wrong: (bars) => (bothClimb(bars) ? onDial(bars, (bars.slopeBelow + bars.slopeAbove) / 4) : null),
  },
]

/** The two faces a mitered bar can be long on. */
const faces = ['top', 'underside'] as const satisfies readonly LongPointFace[]

/** Saw setting and long face, from two slopes read with the angle finder. */
export const settingAndFace: Exercise<Bars> = {
  id: 'half-the-bend/setting-and-face',
  revision: 1,
  kind: 'two-part',
  asks: 'Going up the stairs you read these slopes on each side of a knuckle. Set the saw, then say which face is long.',
  gives: ['slopeBelow', 'slopeAbove', 'sawAtSquare'],
  drawGivens: (draws) => ({
    ...draws.pick([drawLevel, drawLevel, drawFlights])(draws),
    sawAtSquare: drawSaw(draws),
  }),
  parts: [
    {
      kind: 'number',
      asks: 'Saw setting',
      measure: 'angle',
      solve: (bars) => onDial(bars, miterOf(bars).miter),
      slips: settingSlips,
    },
    {
      kind: 'choice',
      asks: 'Long point, on both bars',
      options: faces,
      solve: (bars) => miterOf(bars).longPointFace,
      slips: [
        {
          code: 'wrong-long-face',
          wrong: (bars) => faces.find((face) => face !== miterOf(bars).longPointFace) ?? null,
        },
      ],
    },
  ],
}

/** Four knuckles in the order of their saw settings. */
export const inOrder: Exercise<Row> = {
  id: 'half-the-bend/in-order',
  revision: 1,
  kind: 'order',
  asks: 'Four knuckles wait at the saw. Put them in order of what you set on its dial, smallest reading first.',
  gives: ['knuckles', 'sawAtSquare'],
  drawGivens: (draws) => ({
    knuckles: draws.shuffle([drawLevel, drawLevel, drawFlights, drawFlights].map((drawOne) => drawOne(draws))),
    sawAtSquare: drawSaw(draws),
  }),
  parts: [
    {
      kind: 'order',
      asks: 'Smallest reading first',
      measure: 'angle',
      solve: (row) => row.knuckles.map((knuckle) => onDial(row, miterOf(knuckle).miter)),
      slips: [
        { code: 'wrong-dial', wrong: (row) => row.knuckles.map((knuckle) => onOtherDial(row, miterOf(knuckle).miter)) },
        {
          code: 'added-pitches',
          wrong: (row) => row.knuckles.map(({ slopeBelow, slopeAbove }) => onDial(row, (slopeBelow + slopeAbove) / 2)),
        },
      ],
    },
  ],
}
