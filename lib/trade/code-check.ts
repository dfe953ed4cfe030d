import { atanDeg } from './angles'
import { notNegative, positive } from './checks'
import { judgeRows, type CodeRow } from './code-rows'
import { firstRefusal, type Refusal } from './refusal'

export interface CodeCheckGiven {
  railHeight: number
  topExtension: number
  bottomExtensionHoriz: number
  run: number
  rise: number
  outsideDia: number
  wallClearance: number
  /** Largest riser less the smallest; not judged when left out. */
  riserSpread?: number | null
}

/** One stair and its rail against every row; unrounded, and a value on its limit passes. Inches. */
export function codeCheck(given: CodeCheckGiven): { pitch: number; checks: CodeRow[] } | Refusal {
  const { railHeight, topExtension, bottomExtensionHoriz, run, rise, outsideDia, wallClearance } = given
  const riserSpread = given.riserSpread ?? null
  const fault = firstRefusal([
    positive('railHeight', railHeight, 'The rail height'),
    notNegative('topExtension', topExtension, 'The top extension'),
    notNegative('bottomExtensionHoriz', bottomExtensionHoriz, 'The bottom extension'),
    positive('run', run, 'The run'),
    positive('rise', rise, 'The rise'),
    positive('outsideDia', outsideDia, 'The outside diameter'),
    notNegative('wallClearance', wallClearance, 'The clearance to the wall'),
    riserSpread === null ? null : notNegative('riserSpread', riserSpread, 'The riser spread'),
  ])
  if (fault) return fault
  const pitch = atanDeg(rise, run)
  const flights = [{ pitch, rises: [rise], run }]
  const heights = [railHeight]
  return {
    pitch,
    checks: judgeRows({ heights, flights, topExtension, bottomExtensionHoriz, outsideDia, wallClearance, riserSpread }),
  }
}
