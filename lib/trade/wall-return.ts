import { notNegative, positive } from './checks'
import { firstRefusal, refuse, type Refusal } from './refusal'

export interface WallReturn {
  longPoint: number
  centre: number
  shortPoint: number
  railCentreToWall: number
  /** Plan angle on both mating parts; the wall end is square. */
  miter: number
}

/** The little piece that turns the rail to the wall, mitered 45° in plan. Inches. */
export function wallReturn(given: { outside: number; clearance: number; gap?: number | null }): WallReturn | Refusal {
  const { outside, clearance } = given
  const gap = given.gap ?? 0
  const fault = firstRefusal([
    positive('outside', outside, 'The width of the rail'),
    positive('clearance', clearance, 'The clearance to the wall'),
    notNegative('gap', gap, 'The gap left at the wall'),
    gap < clearance ? null : refuse('gap', 'The gap left at the wall must be less than the clearance.'),
  ])
  if (fault) return fault
  return {
    longPoint: clearance + outside - gap,
    centre: clearance + outside / 2 - gap,
    shortPoint: clearance - gap,
    railCentreToWall: clearance + outside / 2,
    miter: 45,
  }
}
