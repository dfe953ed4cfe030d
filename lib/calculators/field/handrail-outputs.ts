import { flag, groupOf, listOf, onDial, onTape, shapeOf, toDecimals, words } from '../outputs'

const endOf = (label: string) =>
  groupOf(label, {
    saw: onDial('Saw, 0 is square'),
    exact: toDecimals('Exactly', 'deg', 2),
    longPoint: words('Long point'),
  })

const part = groupOf('Part', {
  mark: words('Mark'),
  kind: words('Part'),
  slope: toDecimals('Slope', 'deg', 2),
  topEdge: onTape('Top edge'),
  underside: onTape('Underside'),
  centre: onTape('Centre line'),
  overall: onTape('Blank, tip to tip'),
  setbackA: onTape('Low end loses'),
  setbackB: onTape('High end loses'),
  cuts: words('Between cuts'),
  endA: endOf('Low end'),
  endB: endOf('High end'),
  note: words('Note'),
  turn: words('Quarter turn'),
  corners: shapeOf('Corners in elevation'),
})

const joint = groupOf('Joint', {
  bend: toDecimals('Bend', 'deg', 2),
  miter: toDecimals('Miter, exactly', 'deg', 2),
  included: toDecimals('Angle to hold', 'deg', 1),
  sawSquareIs0: onDial('Saw, 0 is square'),
  sawSquareIs90: onDial('Saw, 90 is square'),
  longPointFace: words('Long point'),
  setback: onTape('Each piece loses'),
  dialGap: toDecimals('The dial costs', 'in', 3),
  perimeter: toDecimals('Weld around', 'in', 1),
})

const returned = groupOf('Return', {
  end: words('End'),
  longPoint: onTape('Long point'),
  centre: onTape('Centre line'),
  shortPoint: onTape('Short point'),
  rolledWithRake: toDecimals('Rolled with the rake', 'deg', 2),
  weld: toDecimals('Weld around', 'in', 1),
  turns: words('Turns to the wall'),
})

/** Spaced brackets carry a list of marks, a field bracket one. */
const bracket = groupOf('Brackets', {
  n: toDecimals('Bracket', 'none', 0),
  part: words('Part'),
  spacing: onTape('Spacing'),
  fromBottomNosingHorizontal: onTape('Level from the bottom nosing'),
  alongTopFromLowEnd: onTape('Along the top from the low end'),
  alongUndersideFromLowEnd: onTape('Along the underside from the low end'),
  off: flag('Off the rail'),
  tooCloseToJoint: flag('Too close to a joint'),
})

/** What a field measure of one rail gives, bottom to top. */
export const handrailOutputs = {
  hand: words('Hand, going up'),
  pitches: listOf('Pitches', toDecimals('Pitch', 'deg', 2)),
  parts: listOf('Parts', part),
  joints: listOf('Joints', joint),
  returns: listOf('Returns', returned),
  brackets: listOf('Brackets', bracket),
  stock: groupOf('Sticks', {
    sticks: toDecimals('Sticks', 'none', 0),
    bars: listOf('Bars', listOf('Bar', onTape('Piece'))),
    drops: listOf('Drops', onTape('Drop')),
    yieldPct: toDecimals('Used', '%', 1),
    bound: toDecimals('No fewer than', 'none', 0),
    proved: flag('Proved'),
    marks: listOf('Marks', listOf('Bar', words('Mark'))),
    nested: shapeOf('Bars with mitered ends laid nose to tail'),
  }),
  weld: groupOf('Weld', {
    lengthIn: toDecimals('Weld', 'in', 1),
    depositedLb: toDecimals('Deposited', 'lb', 2),
    fillerLb: toDecimals('Filler', 'lb', 2),
    arcMinutes: toDecimals('Arc', 'min', 1),
    clockMinutes: toDecimals('Clock', 'min', 1),
  }),
  checks: listOf(
    'Code rows',
    groupOf('Row', {
      id: words('Row'),
      ok: flag('Within'),
      value: words('Value'),
      limit: words('Limit'),
      source: words('Source'),
    }),
  ),
  knuckles: groupOf('Knuckles', {
    fromTopNosing: onTape('From the top nosing, + uphill'),
    fromBottomNosing: onTape('From the bottom nosing, + uphill'),
  }),
  closing: listOf(
    'Closing check',
    groupOf('Flight', { flight: toDecimals('Flight', 'none', 0), error: onTape('Off by'), verdict: words('Verdict') }),
  ),
  topLine: shapeOf('Top of the rail, low end to high end'),
  nosings: shapeOf('Nosings of each flight'),
  stair: shapeOf('The stair under the rail'),
  warnings: shapeOf('Warnings'),
} as const
