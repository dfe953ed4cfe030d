import { judgeRows, type CodeRow } from '../code-rows'
import type { TopLine } from './top-line'
import type { CodeGiven, HandrailInputs, HandrailOutputs, Point } from './types'

/** Every height that the rail has: the stair's, each landing's and each level end's. */
export function heightsOf({ railHeight, landings, bottom, top }: HandrailInputs): { field: string; height: number }[] {
  const own = (field: string, height: number | null | undefined) =>
    typeof height === 'number' ? [{ field, height }] : []
  return [
    { field: 'railHeight', height: railHeight },
    ...(landings ?? []).flatMap((landing, i) => own(`landings[${i}].railHeight`, landing.railHeight)),
    ...(bottom.type === 'level' ? own('bottom.railHeight', bottom.railHeight) : []),
    ...(top.type === 'level' ? own('top.railHeight', top.railHeight) : []),
  ]
}

/** Level past the top nosing, or past the knuckle where that stands over the landing. */
function topExtension({ top }: HandrailInputs, pastNosing: number | null): number {
  return pastNosing === null ? 0 : (top.length ?? 0) - Math.max(0, pastNosing)
}

/** Horizontal reach on the slope in front of the bottom nosing. */
function bottomExtension({ bottom }: HandrailInputs, points: readonly Point[], beforeNosing: number | null): number {
  if (bottom.type === 'level') return -(beforeNosing ?? 0)
  return bottom.type === 'slope' ? -(points[0]?.x ?? 0) : 0
}

/** Every code row on the whole rail: each flight and each height by its own figures. */
export function judgeRail(
  field: HandrailInputs,
  code: CodeGiven,
  { flights, points }: TopLine,
  { fromTopNosing, fromBottomNosing }: HandrailOutputs['knuckles'],
): CodeRow[] {
  return judgeRows({
    heights: heightsOf(field).map(({ height }) => height),
    flights: flights.map(({ pitch, rises, unitRun }) => ({ pitch, rises, run: unitRun })),
    topExtension: topExtension(field, fromTopNosing),
    bottomExtensionHoriz: bottomExtension(field, points, fromBottomNosing),
    outsideDia: code.outsideDia,
    wallClearance: code.wallClearance,
    riserSpread: null,
  })
}
