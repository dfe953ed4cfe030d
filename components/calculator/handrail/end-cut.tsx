'use client'

import type { Preferences } from '@/lib/schemas/account'
import type { PartEnd } from '@/lib/trade/rail/types'
import { faceWords, sawReading } from '@/lib/trade/rail/words'
import { FaceSign } from '../../ui/face-sign'
import { Dial } from '../../ui/tape'

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
        {end.longPoint !== 'room side (plan)' && <FaceSign face={end.longPoint} />} {faceWords[end.longPoint]}
      </span>
      <small>exactly {Number(sawReading(end.exact, preferences.sawSquare).toFixed(2))}°</small>
    </>
  )
}
