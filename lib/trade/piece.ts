import { tanDeg } from './angles'
import { positive } from './checks'
import { firstRefusal, refuse, type Refusal } from './refusal'

export type EndFace = 'top' | 'underside' | 'square'
export type PieceReference = 'top' | 'underside' | 'centre' | 'overall'

/** One mitered end: how far the long point stands past the short one, and on which face. */
export interface PieceEnd {
  setback: number
  face: EndFace
}

export interface PieceDimensions {
  centre: number
  topEdge: number
  underside: number
  /** Blank, tip to tip along the stock. */
  overall: number
  setbackA: number
  setbackB: number
  /** Slide or roll between the two cuts, as seen in elevation. */
  cuts: string
}

/** +1 where the end's long point lengthens the top edge, -1 where it shortens it. */
export const longOnTop = (face: EndFace) => (face === 'square' ? 0 : face === 'top' ? 1 : -1)

/** How the stock is handled between the two cuts of a piece, miters seen in elevation. */
export function cutsText(a: EndFace, b: EndFace): string {
  if (a === 'square' && b === 'square') return 'square both ends'
  if (a === 'square' || b === 'square') return 'one mitered end'
  return a === b ? 'opposed: roll the stock half a turn between cuts' : 'parallel: slide the stock, do not roll it'
}

/** Every length of a piece whose top edge is known. Inches. */
export function pieceFromTop(topEdge: number, a: PieceEnd, b: PieceEnd): PieceDimensions {
  const centre = topEdge - (longOnTop(a.face) * a.setback + longOnTop(b.face) * b.setback) / 2
  return {
    centre,
    topEdge,
    underside: 2 * centre - topEdge,
    overall: centre + (a.setback + b.setback) / 2,
    setbackA: a.setback,
    setbackB: b.setback,
    cuts: cutsText(a.face, b.face),
  }
}

/** Top edge of a piece known by another of its lengths. */
function topFrom(reference: PieceReference, length: number, a: PieceEnd, b: PieceEnd): number {
  const lean = longOnTop(a.face) * a.setback + longOnTop(b.face) * b.setback
  switch (reference) {
    case 'top':
      return length
    case 'underside':
      return length + lean
    case 'centre':
      return length + lean / 2
    case 'overall':
      return length - (a.setback + b.setback) / 2 + lean / 2
  }
}

export interface PieceGiven {
  length: number
  ref: PieceReference
  depth: number
  miterA?: number | null
  faceA: EndFace
  miterB?: number | null
  faceB: EndFace
}

function endFault(end: 'A' | 'B', miter: number, face: EndFace): Refusal | null {
  if (!(miter >= 0 && miter < 90)) return refuse(`miter${end}`, 'A miter lies between 0° and 90° off square.')
  return face === 'square' && miter > 0
    ? refuse(`face${end}`, 'A mitered end has its long point on top or underneath: say which.')
    : null
}

/** Long point, short point, centre line and blank of one piece from any one of its lengths. Inches and degrees. */
export function pieceFrom(given: PieceGiven): PieceDimensions | Refusal {
  const { length, ref, depth, faceA, faceB } = given
  const miterA = given.miterA ?? 0
  const miterB = given.miterB ?? 0
  const fault = firstRefusal([
    positive('length', length, 'The length'),
    positive('depth', depth, 'The depth'),
    endFault('A', miterA, faceA),
    endFault('B', miterB, faceB),
  ])
  if (fault) return fault
  const a = endOf(depth, miterA, faceA)
  const b = endOf(depth, miterB, faceB)
  const piece = pieceFromTop(topFrom(ref, length, a, b), a, b)
  if (Math.min(piece.topEdge, piece.underside) > 0) return piece
  return refuse('length', 'The two cuts cross before they reach the short side: the piece must be longer.')
}

/** An end cut at 0° is square, whatever face was named. */
function endOf(depth: number, miter: number, face: EndFace): PieceEnd {
  return { setback: depth * tanDeg(miter), face: miter === 0 ? 'square' : face }
}
