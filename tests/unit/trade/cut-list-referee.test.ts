import fc from 'fast-check'
import createHighs from 'highs'
import { describe, expect, it } from 'vitest'
import { cutList } from '@/lib/trade/cut-list/cut-list'
import { isRefusal } from '@/lib/trade/refusal'

/** In sixteenths of an inch, so that both sides add whole numbers. */
interface Instance {
  pieces: number[]
  stock: number
  kerf: number
}

const instance: fc.Arbitrary<Instance> = fc.constantFrom([12, 70], [20, 50], [30, 90]).chain(([least, most]) =>
  fc.record({
    pieces: fc.array(fc.integer({ min: least ?? 0, max: most ?? 0 }), { minLength: 4, maxLength: 9 }),
    stock: fc.constantFrom(96, 110, 130),
    kerf: fc.constantFrom(0, 1, 2),
  }),
)

/** The packing as an integer program in LP format: x1_2 puts piece 1 in stick 2, y2 buys stick 2. */
function program({ pieces, stock, kerf }: Instance): string {
  const sticks = pieces.map((_, stick) => stick)
  const terms = (parts: string[]) => parts.join(' + ')
  const once = pieces.map((_, i) => `${terms(sticks.map((j) => `x${i}_${j}`))} = 1`)
  const fit = sticks.map(
    (j) => `${terms(pieces.map((piece, i) => `${piece + kerf} x${i}_${j}`))} - ${stock + kerf} y${j} <= 0`,
  )
  const inOrder = sticks.slice(1).map((j) => `y${j - 1} - y${j} >= 0`)
  const names = [...sticks.map((j) => `y${j}`), ...pieces.flatMap((_, i) => sticks.map((j) => `x${i}_${j}`))]
  return `Minimize\n ${terms(sticks.map((j) => `y${j}`))}\nSubject To\n ${[...once, ...fit, ...inOrder].join('\n ')}\nBinary\n ${names.join(' ')}\nEnd`
}

describe('cut list against an integer program', () => {
  it('buys as many sticks as HiGHS does', async () => {
    const highs = await createHighs()
    const seen = new Set<number>()
    fc.assert(
      fc.property(instance, (given) => {
        const solved = highs.solve(program(given), { output_flag: false })
        if (solved.Status !== 'Optimal') throw new Error(solved.Status)
        const list = cutList({
          pieces: given.pieces.map((n) => n / 16),
          stock: given.stock / 16,
          kerf: given.kerf / 16,
        })
        if (isRefusal(list)) throw new Error(list.message)
        expect(list.sticks).toBe(Math.round(solved.ObjectiveValue))
        expect(list.proved).toBe(true)
        seen.add(list.sticks)
      }),
      { numRuns: 40 },
    )
    // One answer for every instance would compare nothing.
    expect(seen.size).toBeGreaterThan(1)
  }, 60_000)
})
