import { describe, expect, it } from 'vitest'
import { codeCheck, type CodeCheckGiven } from '@/lib/trade/code-check'
import { consumables, type ConsumablesGiven } from '@/lib/trade/consumables'
import { cutList, type CutListGiven } from '@/lib/trade/cut-list/cut-list'
import { fieldCheck } from '@/lib/trade/field-check'
import { knuckles, type KnuckleGiven } from '@/lib/trade/knuckle'
import { miterAt } from '@/lib/trade/miter'
import { nosingLine } from '@/lib/trade/nosing-line'
import { pieceFrom, type PieceGiven } from '@/lib/trade/piece'
import { pitchFrom } from '@/lib/trade/pitch'
import { solveHandrail } from '@/lib/trade/rail/solve'
import type { HandrailInputs, HandrailOutputs } from '@/lib/trade/rail/types'
import { isRefusal } from '@/lib/trade/refusal'
import { sawDial } from '@/lib/trade/saw-dial'
import { wallReturn } from '@/lib/trade/wall-return'
import { weldLength, type WeldLengthGiven } from '@/lib/trade/weld-length'
import { examplesOf, expectWithin } from '@/tests/support/examples'

type Inputs = Record<string, unknown>
const as = <T>(inputs: Inputs) => inputs as unknown as T

/** The contract's names, with the fallbacks that an entry would fill in. */
const solvers: Record<string, (inputs: Inputs) => unknown> = {
  pitch: (x) => pitchFrom(as<Parameters<typeof pitchFrom>[0]>(x)),
  'field-check': (x) => fieldCheck(as<Parameters<typeof fieldCheck>[0]>(x)),
  'nosing-line': (x) => nosingLine(as<Parameters<typeof nosingLine>[0]>(x)),
  'knuckle-height': (x) => knuckles(as<KnuckleGiven>(x)),
  miter: ({ slopeBelow, slopeAbove, depth }) => miterAt(Number(slopeBelow), Number(slopeAbove), Number(depth), 0.25),
  'long-short-point': (x) => pieceFrom(as<PieceGiven>(x)),
  'saw-dial': (x) => sawDial(as<Parameters<typeof sawDial>[0]>(x)),
  'wall-return': (x) => wallReturn(as<Parameters<typeof wallReturn>[0]>(x)),
  'cut-list': (x) => cutList(as<CutListGiven>(x)),
  'code-check': (x) => codeCheck(as<CodeCheckGiven>(x)),
  'weld-length': (x) => weldLength(as<WeldLengthGiven>(x)),
  consumables: (x) => consumables(as<ConsumablesGiven>(x)),
}

describe.each(Object.keys(solvers))('worked examples of %s', (calculator) => {
  it.each(examplesOf(calculator))('$id', ({ inputs, expected, tolerance }) => {
    expectWithin(solvers[calculator]?.(inputs), expected, tolerance.abs)
  })
})

describe('worked examples of the whole rail', () => {
  it.each(examplesOf('handrail'))('$id', ({ inputs, expected, tolerance }) => {
    const solved = solveHandrail(as<HandrailInputs>(inputs), { tape: 16, dial: 0.25 })
    if (isRefusal(solved)) throw new Error(`${solved.field}: ${solved.message}`)
    const { failedChecks, ...values } = expected
    expectWithin(solved, values, tolerance.abs)
    if (failedChecks) expect(failedOf(solved)).toEqual(failedChecks)
  })

  it('covers every form that the contract shows', () => {
    expect(examplesOf('handrail').length).toBeGreaterThanOrEqual(9)
  })
})

const failedOf = ({ checks }: HandrailOutputs) => (checks ?? []).filter(({ ok }) => ok === false).map(({ id }) => id)
