import { notNegative, positive } from './checks'
import { firstRefusal, refuse, type Refusal } from './refusal'

/** Weight of steel in pounds a cubic inch. */
export const steelLbPerIn3 = 0.2836

export interface ConsumablesGiven {
  areaIn2: number
  lengthIn: number
  /** Share of the filler that ends in the weld, 0 to 1. */
  efficiency: number
  lbPerHour: number
  arcOnPct: number
}

export interface ConsumablesAnswer {
  depositedLb: number
  fillerLb: number
  arcMinutes: number
  clockMinutes: number
}

/** Filler to buy and time to plan for so many inches of one bead. */
export function consumables(given: ConsumablesGiven): ConsumablesAnswer | Refusal {
  const { areaIn2, lengthIn, efficiency, lbPerHour, arcOnPct } = given
  const fault = firstRefusal([
    notNegative('areaIn2', areaIn2, 'The area of the bead'),
    notNegative('lengthIn', lengthIn, 'The length of weld'),
    efficiency > 0 && efficiency <= 1
      ? null
      : refuse('efficiency', 'The efficiency is a share between 0 and 1, as 0.93.'),
    positive('lbPerHour', lbPerHour, 'The deposition rate'),
    arcOnPct > 0 && arcOnPct <= 100 ? null : refuse('arcOnPct', 'Arc-on time is a percentage between 0 and 100.'),
  ])
  if (fault) return fault
  const depositedLb = steelLbPerIn3 * areaIn2 * lengthIn
  const arcMinutes = (depositedLb / lbPerHour) * 60
  return { depositedLb, fillerLb: depositedLb / efficiency, arcMinutes, clockMinutes: (arcMinutes * 100) / arcOnPct }
}
