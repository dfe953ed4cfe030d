import { tanDeg } from './angles'
import { between, positive } from './checks'
import { firstRefusal, type Refusal } from './refusal'

export interface KnuckleGiven {
  pitch: number
  rakeHeight: number
  topLevelHeight: number
  bottomLevelHeight?: number | null
  firstRise?: number | null
}

export interface KnuckleAnswer {
  /** + over the landing. */
  pastTopNosing: number
  /** `null` when the bottom run or its first riser was not given. */
  beforeBottomNosing: number | null
}

/** Where the rake turns level, measured from the nosings. Heights plumb, inches; pitch in degrees. */
export function knuckles(given: KnuckleGiven): KnuckleAnswer | Refusal {
  const { pitch, rakeHeight, topLevelHeight, bottomLevelHeight, firstRise } = given
  const fault = firstRefusal([
    between('pitch', pitch, 0, 90, 'The pitch'),
    positive('rakeHeight', rakeHeight, 'The height on the rake'),
    positive('topLevelHeight', topLevelHeight, 'The height of the top run'),
  ])
  if (fault) return fault
  const steep = tanDeg(pitch)
  const hasBottom = typeof bottomLevelHeight === 'number' && typeof firstRise === 'number'
  return {
    pastTopNosing: (topLevelHeight - rakeHeight) / steep,
    beforeBottomNosing: hasBottom ? (firstRise + rakeHeight - bottomLevelHeight) / steep : null,
  }
}
