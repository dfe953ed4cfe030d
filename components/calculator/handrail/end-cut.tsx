'use client'

import type { Preferences } from '@/lib/schemas/account'
import { showDial } from '@/lib/trade/quantity/dial'
import type { PartEnd } from '@/lib/trade/rail/types'
import { Dial } from '../../ui/tape'

export const faceWords: Readonly<Record<PartEnd['longPoint'], string>> = {
  top: 'long on top',
  underside: 'long underneath',
  square: 'square',
  'room side (plan)': 'long on the room side, cut in plan',
}

/** What the saw reads for an angle off square, by what this reader's saw calls square. */
export const sawReading = (offSquare: number, { sawSquare }: Pick<Preferences, 'sawSquare'>) =>
  sawSquare === 90 ? 90 - offSquare : offSquare

/** One end's cut in words: `saw 16 1/4°, long on top`. */
export function endText(end: PartEnd, step: number, preferences: Pick<Preferences, 'sawSquare'>): string {
  if (end.longPoint === 'square') return 'square'
  return `saw ${showDial(sawReading(end.saw, preferences), step)}, ${faceWords[end.longPoint]}`
}

/** Triangle at the long point: down where it lies on top, up where it lies underneath, as in the drawing. */
function FaceSign({ face }: { face: PartEnd['longPoint'] }) {
  if (face !== 'top' && face !== 'underside') return null
  return (
    <svg className="face-sign" width="14" height="11" viewBox="0 0 14 11" aria-hidden="true">
      <path d={face === 'top' ? 'M0 0h14L7 11z' : 'M0 11h14L7 0z'} fill="currentColor" />
    </svg>
  )
}

interface EndCutProps {
  end: PartEnd
  step: number
  preferences: Preferences
}

/** Saw setting and long-point face of one end, with the exact angle small. */
export function EndCut({ end, step, preferences }: EndCutProps) {
  if (end.longPoint === 'square') return <b className="cut-square">square</b>
  return (
    <>
      <b className="cut-saw">
        <Dial deg={sawReading(end.saw, preferences)} step={step} />
      </b>
      <span className={end.longPoint === 'room side (plan)' ? 'cut-face cut-face-plan' : 'cut-face'}>
        <FaceSign face={end.longPoint} /> {faceWords[end.longPoint]}
      </span>
      <small>exactly {Number(sawReading(end.exact, preferences).toFixed(2))}°</small>
    </>
  )
}
