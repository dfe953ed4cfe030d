import type { RailPart } from '@/lib/trade/rail/types'

/** Which piece of the stair each part of the rail belongs to. */
export function partMarks(parts: readonly RailPart[]) {
  const of = (kind: RailPart['kind']) => parts.filter((part) => part.kind === kind).map(({ mark }) => mark)
  return {
    bottom: of('bottom level')[0],
    flights: of('rake'),
    landings: of('landing'),
    top: of('top level')[0],
  }
}
