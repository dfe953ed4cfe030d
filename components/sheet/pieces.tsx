import type { Line, Piece, SheetReading } from '@/lib/print/sheet/sheet'
import { Dial, Tape } from '../ui/tape'
import { FaceSign } from '../ui/face-sign'

/** One line of a sheet: words, lengths as the tape shows them, angles as the dial does, signs of the long point. */
export function Pieces({ line, reading }: { line: Line; reading: SheetReading }) {
  return line.map((piece, i) => <OnePiece key={i} piece={piece} reading={reading} />)
}

function OnePiece({ piece, reading: { precision, preferences } }: { piece: Piece; reading: SheetReading }) {
  if (typeof piece === 'string') return <span className="printed-word">{piece}</span>
  if ('strong' in piece) return <b>{piece.strong}</b>
  if ('tape' in piece)
    return (
      <b className="printed-number">
        <Tape inches={piece.tape} den={precision.tape} units={preferences.units} />
      </b>
    )
  if ('dial' in piece)
    return (
      <b className="printed-number">
        <Dial deg={piece.dial} step={precision.dial} />
      </b>
    )
  return <FaceSign face={piece.face} />
}
