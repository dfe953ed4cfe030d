import { describe, expect, it } from 'vitest'
import { codeCheck, type CodeCheckGiven } from '@/lib/trade/code-check'
import { isRefusal } from '@/lib/trade/refusal'

const passing: CodeCheckGiven = {
  railHeight: 36,
  topExtension: 12,
  bottomExtensionHoriz: 11,
  run: 11,
  rise: 7,
  outsideDia: 1.5,
  wallClearance: 2.25,
  riserSpread: 0.375,
}

const rowOf = (change: Partial<CodeCheckGiven>, id: string) => {
  const answer = codeCheck({ ...passing, ...change })
  if (isRefusal(answer)) throw new Error(answer.message)
  return answer.checks.find((row) => row.id === id)
}

describe('code rows', () => {
  it('passes all eleven on their limits', () => {
    const answer = codeCheck(passing)
    if (isRefusal(answer)) throw new Error(answer.message)
    expect(answer.checks).toHaveLength(11)
    expect(answer.checks.filter(({ ok }) => ok !== true)).toEqual([])
  })

  it.each<[string, Partial<CodeCheckGiven>, Partial<CodeCheckGiven>]>([
    ['height-34-38', { railHeight: 34 }, { railHeight: 33.99 }],
    ['height-34-38', { railHeight: 38 }, { railHeight: 38.01 }],
    ['height-30-38-osha', { railHeight: 30 }, { railHeight: 29.99 }],
    ['top-extension-12', { topExtension: 12 }, { topExtension: 11.999 }],
    ['bottom-extension-tread', { bottomExtensionHoriz: 11 }, { bottomExtensionHoriz: 10.999 }],
    ['grip-1.25-2', { outsideDia: 1.25 }, { outsideDia: 1.24 }],
    ['grip-1.25-2', { outsideDia: 2 }, { outsideDia: 2.01 }],
    ['wall-clearance-1.5', { wallClearance: 1.5 }, { wallClearance: 1.49 }],
    ['finger-clearance-2.25-osha', { wallClearance: 2.25 }, { wallClearance: 2.24 }],
    ['riser-tread-ibc', { rise: 4 }, { rise: 3.99 }],
    ['riser-tread-ibc', { rise: 7, run: 11 }, { rise: 7.01 }],
    ['riser-tread-ibc', { run: 11 }, { run: 10.99 }],
    ['riser-tread-irc', { rise: 7.75, run: 10 }, { rise: 7.76 }],
    ['riser-tread-irc', { run: 10 }, { run: 9.99 }],
    ['stair-angle-osha', { rise: 9.5, run: 9.5 }, { rise: 9.51, run: 11 }],
    ['stair-angle-osha', { rise: 6, run: 10.39 }, { rise: 6, run: 10.4 }],
    ['riser-spread', { riserSpread: 0.375 }, { riserSpread: 0.376 }],
  ])('%s turns at its limit', (id, inside, outside) => {
    expect(rowOf(inside, id)).toMatchObject({ ok: true })
    expect(rowOf(outside, id)).toMatchObject({ ok: false })
  })

  it('leaves the spread open where it was not measured', () => {
    expect(rowOf({ riserSpread: null }, 'riser-spread')).toMatchObject({ ok: null, value: null })
  })

  it.each(['railHeight', 'run', 'rise', 'outsideDia'] as const)('refuses a %s of nothing', (field) => {
    expect(codeCheck({ ...passing, [field]: 0 })).toMatchObject({ refused: true, field })
  })

  it.each(['topExtension', 'bottomExtensionHoriz', 'wallClearance', 'riserSpread'] as const)(
    'refuses a %s below nothing',
    (field) => {
      expect(codeCheck({ ...passing, [field]: -1 })).toMatchObject({ refused: true, field })
    },
  )
})
