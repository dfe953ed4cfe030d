import { cosDeg, tanDeg, toDial } from './angles'
import { hair } from './tolerance'

export type LongPointFace = 'top' | 'underside' | 'none'

export interface MiterAnswer {
  bend: number
  miter: number
  /** Angle to hold between the two bars. */
  included: number
  sawSquareIs0: number
  sawSquareIs90: number
  /** Face that carries the long point on both bars; `none` where the line does not bend. */
  longPointFace: LongPointFace
  /** Gap at the short points when both bars are cut at the dial's nearest mark, in inches. */
  dialGap: number
  /** From long point to short point along the bar, in inches. */
  setback: number
}

/** Going up the stairs: a line that turns down is long on top, one that turns up is long underneath. */
function longFace(below: number, above: number): LongPointFace {
  if (Math.abs(below - above) < hair) return 'none'
  return below > above ? 'top' : 'underside'
}

/**
 * Saw setting where two bars of one depth meet: half the bend on each.
 * Slopes in degrees, up positive; depth in inches as seen from the side; `dialStep` in degrees.
 */
export function miterAt(below: number, above: number, depth: number, dialStep: number): MiterAnswer {
  const longPointFace = longFace(below, above)
  const bend = longPointFace === 'none' ? 0 : Math.abs(below - above)
  const miter = bend / 2
  const dial = toDial(miter, dialStep)
  return {
    bend,
    miter,
    included: 180 - bend,
    sawSquareIs0: dial,
    sawSquareIs90: 90 - dial,
    longPointFace,
    dialGap: 2 * (depth / cosDeg(miter)) * tanDeg(Math.abs(miter - dial)),
    setback: depth * tanDeg(miter),
  }
}
