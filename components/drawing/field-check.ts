import type { Drawing, LabelRequest, LabelInk, Show, Spot, Stroke } from '@/lib/drawing/sketch'
import { angleArc, nudged, outline, path, spot, toward } from '@/lib/drawing/strokes'
import { degrees, length, plain, word, type Line } from '@/lib/drawing/text'
import type { FieldCheckAnswer } from '@/lib/trade/field-check'

interface Given {
  rise: number
  run: number
  rake: number
  angleFinder: number
}

/** Px of the glass that the gap is looked at through. */
const glassRadius = ({ detail }: Show) => (detail === 'full' ? 62 : 44)

/** Times the gap is enlarged in the glass, so that it is neither a hair nor wider than the glass. */
function magnification({ rise, run }: Given, gap: number): number {
  const roughScale = 560 / Math.max(run, rise * 1.5)
  const wanted = 40 / Math.max(Math.abs(gap) * roughScale, 1e-6)
  return [1, 2, 5, 10, 20, 50, 100].findLast((times) => times <= wanted) ?? 1
}

/** The triangle of the three tapes, the angle finder's own line, and the gap under a glass. */
export const draw: Drawing<Given, FieldCheckAnswer> = (given, solved, show) => {
  const { rise, run, rake } = given
  const pitch = solved.pitchFromTape
  const corner = spot(run, rise)
  const tip = toward(spot(0, 0), pitch, rake)
  const isOff = solved.verdict === 'measure again'
  return {
    strokes: [
      outline('object', [spot(0, 0), spot(run, 0), corner], 'face'),
      path(gapInk(solved), [tip, corner]),
      path('centre', [spot(0, 0), toward(spot(0, 0), given.angleFinder, rake)]),
      ...(pitch > 1 && show.detail === 'full' ? [angleArc(spot(0, 0), 84, 0, pitch)] : []),
      ...glassStrokes(given, solved, glassRadius(show)),
    ],
    labels: labelsOf(given, solved, show, isOff ? 'off' : 'text'),
    says: saysOf(given, solved, show),
  }
}

/** Red is for what is out of tolerance; a gap within it is only shown. */
const gapInk = ({ verdict }: FieldCheckAnswer) => (verdict === 'measure again' ? 'off' : 'cut')

const glassCentre = ({ rise }: Given, glass: number): Spot => spot(0, rise, glass + 6, glass + 24)

/** The upper corner enlarged: where rise and run put it, and where the rake's tape ends. */
function glassStrokes(given: Given, solved: FieldCheckAnswer, glass: number): Stroke[] {
  const centre = glassCentre(given, glass)
  const corner = spot(given.run, given.rise)
  const times = magnification(given, solved.closingError)
  const end = toward(centre, solved.pitchFromTape + 180, solved.closingError * times)
  const ring = angleArc(centre, glass, 0, 360)
  const isShort = solved.closingError > 0
  return [
    ring,
    path('ext', [nudged(centre, -20, glass), nudged(corner, 150, 12)], { passable: true }),
    angleArc(corner, 10, 0, 360),
    path('object', [nudged(centre, -90, glass - 4), centre]),
    path('object', [nudged(centre, solved.pitchFromTape + 180, glass - 4), isShort ? end : centre]),
    ...(Math.abs(solved.closingError) > 1e-4 ? [path(gapInk(solved), [centre, end])] : []),
  ]
}

/** Which way the rake's tape misses, in words with its amount. */
function gapText(solved: FieldCheckAnswer, show: Show, ink: LabelInk): Line {
  const amount = Math.abs(solved.closingError)
  if (amount < 0.5 / show.tape) return [word('the rake closes', 'text')]
  return [
    word('rake reads ', ink),
    ...length(amount, show, ink),
    word(solved.closingError > 0 ? ' short' : ' long', ink),
  ]
}

function labelsOf(given: Given, solved: FieldCheckAnswer, show: Show, ink: LabelInk): LabelRequest[] {
  const { rise, run, rake } = given
  const corner = spot(run, rise)
  const pitch = solved.pitchFromTape
  const times = magnification(given, solved.closingError)
  const glass = glassRadius(show)
  const drift = toward(spot(0, 0), given.angleFinder, rake)
  return [
    {
      kind: 'at',
      text: [
        gapText(solved, show, ink),
        [word(solved.verdict === 'agree' ? 'tapes and finder agree' : solved.verdict, ink)],
      ],
      size: 'number',
      spot: nudged(glassCentre(given, glass), 0, glass),
      prefer: [0, 20, 45, 90],
      gap: 12,
      required: true,
      leader: false,
    },
    {
      kind: 'dimension',
      text: [[...length(rise, show), word(' rise')]],
      size: 'number',
      from: spot(run, 0),
      to: corner,
      side: 'right',
      offset: 34,
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
      kind: 'at',
      text: [degrees(pitch, 1)],
      size: 'number',
      spot: nudged(spot(0, 0), pitch / 2, 84),
      prefer: [pitch / 2, 0, -20, -90],
      gap: 8,
      required: show.detail === 'full',
    },
    {
      kind: 'at',
      text: [[word('enlarged '), word(`×${times}`, 'text')]],
      size: 'note',
      spot: nudged(glassCentre(given, glass), 90, glass),
      prefer: [90, 60, 0],
      gap: 6,
      required: false,
      leader: false,
    },
    {
      kind: 'at',
      text: [
        [word('finder '), ...degrees(given.angleFinder, 1, Math.abs(solved.angleFinderError) > 0.5 ? 'off' : 'quiet')],
      ],
      size: 'note',
      spot: drift,
      prefer: [45, 0, 90, 20, -20],
      gap: 8,
      required: show.detail === 'full',
    },
  ]
}

function saysOf(given: Given, solved: FieldCheckAnswer, show: Show): string {
  const amount = Math.abs(solved.closingError)
  return [
    `Rise ${plain([length(given.rise, show)])}, run ${plain([length(given.run, show)])}, rake ${plain([length(given.rake, show)])}.`,
    amount < 0.5 / show.tape
      ? 'The rake closes.'
      : `The rake reads ${plain([length(amount, show)])} ${solved.closingError > 0 ? 'short' : 'long'}.`,
    `The tapes make ${plain([degrees(solved.pitchFromTape, 1)])}; the angle finder reads ${plain([degrees(given.angleFinder, 1)])}.`,
    `Verdict: ${solved.verdict}.`,
  ].join(' ')
}
