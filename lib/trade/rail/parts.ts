import { toDial } from '../angles'
import { miterAt, type MiterAnswer } from '../miter'
import { longOnTop, pieceFromTop, type EndFace, type PieceEnd } from '../piece'
import { refuse, type Refusal } from '../refusal'
import { hair } from '../tolerance'
import { offset } from './lines'
import { runLength, type Run, type TopLine } from './top-line'
import type { HandrailInputs, PartCorners, PartEnd, Point, RailPart } from './types'

/** Shortest edge that can still be held and cut, in inches. */
const shortestEdge = 2

/** A, B, … Z, AA, AB, … */
export function markOf(index: number): string {
  const letter = String.fromCharCode(65 + (index % 26))
  return index < 26 ? letter : markOf(Math.floor(index / 26) - 1) + letter
}

/** The cut at every knuckle of the top line. */
export function jointsOf({ runs }: TopLine, depth: number, dialStep: number): MiterAnswer[] {
  return runs.slice(1).map((upper, i) => miterAt(runs[i]?.line.slope ?? 0, upper.line.slope, depth, dialStep))
}

/** What stands at one end of a part: a knuckle, or a free end with whatever closes the rail there. */
interface End {
  cut: PieceEnd
  miter: number
  volute: number
  returned: boolean
}

function endOf(joint: MiterAnswer | undefined, volute: number, returned: boolean): End {
  const square: PieceEnd = { setback: 0, face: 'square' }
  if (!joint) return { cut: square, miter: 0, volute, returned }
  const face: EndFace = joint.longPointFace === 'none' ? 'square' : joint.longPointFace
  return { cut: { setback: joint.setback, face }, miter: joint.miter, volute: 0, returned: false }
}

function partEnd({ cut, miter, returned }: End, dialStep: number): PartEnd {
  if (returned) return { saw: toDial(45, dialStep), exact: 45, longPoint: 'room side (plan)' }
  return { saw: toDial(miter, dialStep), exact: miter, longPoint: cut.face }
}

function noteOf(ends: readonly End[]): string | undefined {
  const volutes = ends
    .filter(({ volute }) => volute > 0)
    .map(({ volute }) => `volute ${Number(volute.toFixed(4))} taken off`)
  const returns = ends.filter(({ returned }) => returned).length
  const long = [
    'long on room side by one rail width for the return',
    'long on room side by one rail width at each end for the returns',
  ].slice(returns - 1, returns)
  const notes = [...volutes, ...(returns > 0 ? long : [])]
  return notes.length > 0 ? notes.join('; ') : undefined
}

/** A plan cut after an elevation miter: the saw stays, the stock turns. */
function turnOf(ends: readonly End[]): string | undefined {
  const turns = ends.some(({ returned }) => returned) && ends.some(({ cut }) => cut.face !== 'square')
  return turns ? 'turn the stock a quarter between cuts' : undefined
}

function cornersOf(low: Point, slope: number, topEdge: number, depth: number, a: End, b: End): PartCorners {
  const topA = offset(low, slope, a.volute, 0)
  return {
    topA,
    topB: offset(topA, slope, topEdge, 0),
    undersideA: offset(topA, slope, longOnTop(a.cut.face) * a.cut.setback, depth),
    undersideB: offset(topA, slope, topEdge - longOnTop(b.cut.face) * b.cut.setback, depth),
  }
}

function tooShort(mark: string, shorter: number, run: Run, a: End, b: End): Refusal | null {
  if (shorter >= shortestEdge - hair) return null
  const volute = a.volute > 0 ? 'volutes.bottom' : 'volutes.top'
  if (a.volute + b.volute > 0 && shorter + a.volute + b.volute >= shortestEdge) {
    return refuse(
      volute,
      `The volute leaves part ${mark} (${run.kind}) under 2 in on its shorter edge: take a longer run.`,
    )
  }
  const found =
    shorter > 0
      ? `comes out ${shorter.toFixed(2)} in on its shorter edge, and under 2 in cannot be cut`
      : 'has its two knuckles the wrong way round'
  return refuse(
    run.field,
    `Part ${mark} (${run.kind}) ${found}: check this measure, the heights and the slopes beside it.`,
  )
}

/** Every part from low to high, or the measure that leaves one too short to cut. */
export function cutParts(
  field: HandrailInputs,
  line: TopLine,
  joints: readonly MiterAnswer[],
  dialStep: number,
): RailPart[] | Refusal {
  const { section, bottom, top, volutes } = field
  const parts: RailPart[] = []
  for (const [i, run] of line.runs.entries()) {
    const a = endOf(joints[i - 1], volutes?.bottom ?? 0, Boolean(bottom.return))
    const b = endOf(joints[i], volutes?.top ?? 0, Boolean(top.return))
    const ends = [a, b]
    const topEdge = runLength(line, i) - a.volute - b.volute
    const piece = pieceFromTop(topEdge, a.cut, b.cut)
    const fault = tooShort(markOf(i), Math.min(piece.topEdge, piece.underside), run, a, b)
    if (fault) return fault
    const note = noteOf(ends)
    const turn = turnOf(ends)
    parts.push({
      mark: markOf(i),
      kind: run.kind,
      slope: run.line.slope,
      ...piece,
      overall: piece.overall + section.width * ends.filter(({ returned }) => returned).length,
      endA: partEnd(a, dialStep),
      endB: partEnd(b, dialStep),
      ...(note ? { note } : {}),
      ...(turn ? { turn } : {}),
      corners: cornersOf(line.points[i] ?? { x: 0, y: 0 }, run.line.slope, topEdge, section.depth, a, b),
    })
  }
  return parts
}
