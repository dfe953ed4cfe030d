'use client'

import type { Preferences } from '@/lib/schemas/account'
import type { PartEnd } from '@/lib/trade/rail/types'
import { faceWords, sawReading } from '@/lib/trade/rail/words'
import { Dial } from '../../ui/tape'

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
        <Dial deg={sawReading(end.saw, preferences.sawSquare)} step={step} />
      </b>
      <span className={end.longPoint === 'room side (plan)' ? 'cut-face cut-face-plan' : 'cut-face'}>
        <FaceSign face={end.longPoint} /> {faceWords[end.longPoint]}
      </span>
      <small>exactly {Number(sawReading(end.exact, preferences.sawSquare).toFixed(2))}°</small>
    </>
  )
}
