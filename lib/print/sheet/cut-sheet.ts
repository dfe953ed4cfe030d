import type { Sketch } from '@/lib/drawing/sketch'
import type { HandrailInputs, HandrailOutputs } from '@/lib/trade/rail/types'
import { closingText, heightText, sectionText, sticksText } from '@/lib/trade/rail/words'
import { bracketList } from './bracket-list'
import { jointList } from './joint-list'
import { partsTable } from './parts-table'
import {
  blankRule,
  particularsOf,
  underTitle,
  type Block,
  type Line,
  type Lists,
  type Picture,
  type Remarks,
  type Sheet,
  type SheetHead,
  type SheetReading,
} from './sheet'

export interface CutSheetParts {
  head: SheetHead
  given: HandrailInputs
  solved: HandrailOutputs
  /** The rail in elevation, and the sticks where stock was given. */
  elevation: Sketch
  sticks: Sketch | null
  reading: SheetReading
  address: string
}

/** The cut sheet of a whole rail: everything the saw, the bench and the site need of it. */
export function cutSheetOf({ head, given, solved, elevation, sticks, reading, address }: CutSheetParts): Sheet {
  const { tape } = reading.precision
  const height = heightText(given.railHeight, tape, reading.preferences.units)
  return {
    title: head.job || 'Handrail',
    under: underTitle(head) || 'Cut sheet, not kept in a job',
    particulars: [...particularsOf(head), ...closingLines(solved.closing, tape)],
    hand: solved.hand,
    ...(head.kept?.supersededBy === undefined ? {} : { supersededBy: head.kept.supersededBy }),
    facts: [
      ['Rail ', { strong: sectionText(given.section, tape) }],
      ['Height ', { strong: height }, ' to top'],
      ['Saw ', { strong: `${reading.preferences.sawSquare} = square` }],
      ['Checked by ', blankRule(11), { strong: ' blank = DO NOT CUT' }],
    ],
    blocks: [
      { kind: 'picture', title: 'The rail in elevation', sketch: elevation, as: 'main' },
      ...remarksOf(solved),
      partsTable(solved, reading),
      listsOf(solved),
      ...(sticks && solved.stock ? [sticksPicture(sticks, solved.stock)] : []),
    ],
    cautions: cautionsOf(height),
    address,
    reading,
  }
}

/** What the third tapes said: one line where all close, one a flight that does not. */
function closingLines(closing: HandrailOutputs['closing'], tape: number): Line[] {
  const open = closing.filter(({ verdict }) => verdict === 'measure again')
  if (open.length > 0) return open.map((one): Line => [{ strong: `Flight ${one.flight}: ${closingText(one, tape)}` }])
  if (closing.length === 0) return []
  const most = Math.max(...closing.map(({ error }) => Math.abs(error)))
  return [['closing check within ', { tape: most }]]
}

function remarksOf({ warnings }: HandrailOutputs): Remarks[] {
  return warnings.length === 0 ? [] : [{ kind: 'remarks', lines: warnings.map(({ message }) => [message]) }]
}

function listsOf(solved: HandrailOutputs): Lists {
  const brackets = bracketList(solved.brackets)
  return { kind: 'lists', lists: [...(brackets ? [brackets] : []), jointList(solved)] }
}

const sticksPicture = (sketch: Sketch, stock: NonNullable<HandrailOutputs['stock']>): Block & Picture => ({
  kind: 'picture',
  title: 'Sticks',
  says: `Sticks: ${sticksText(stock)}; ${stock.yieldPct.toFixed(0)} % used`,
  sketch,
  as: 'strip',
})

function cautionsOf(height: string): Line[] {
  return [
    [
      { strong: 'Dry-fit on the stair before you weld out.' },
      ' Heights, extensions, loads and fixings are decided by the adopted local code and a licensed professional.',
    ],
    [`At the dry fit: ${height} plumb at every nosing, level runs level, both ends past the nosings.`],
  ]
}
