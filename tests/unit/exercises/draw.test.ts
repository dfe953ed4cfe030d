import { describe, expect, it } from 'vitest'
import { draw, drawTwin, shownDraw, tellsApart, type ShownDraw } from '@/lib/exercises/draw'
import type { AnyGivens } from '@/lib/exercises/exercise'
import { drawsFrom } from '@/lib/exercises/seed'
import { numberExercise } from '../../support/made-up-exercise'

const seeds = Array.from({ length: 50 }, (_, seed) => seed)

describe('a draw', () => {
  it.each([
    ['a slip inside the tolerance', false, [['full-pitch', 74.55]]],
    ['a slip that rounds into the tolerance', false, [['full-pitch', 74.6]]],
    [
      'two slips that look alike',
      false,
      [
        ['full-pitch', 80],
        ['radians', 80.1],
      ],
    ],
    [
      'slips apart',
      true,
      [
        ['full-pitch', 80],
        ['radians', 81],
      ],
    ],
    ['a slip there is no room for', true, [['full-pitch', null]]],
  ] as const)('with %s can be judged: %s', (_what, can, slips) => {
    const { parts } = numberExercise('length', 74.5, slips)
    expect(parts.map((part) => tellsApart(part, {}))).toEqual([can])
  })

  it('is drawn again until its slips stand apart, and says so when they never do', () => {
    const never = numberExercise('length', 74.5, [['full-pitch', 74.5]])
    expect(() => draw(never, 3)).toThrow('made-up/number: no draw from seed 3 keeps its slips apart')

    const hidden = ({ unitRise = 0 }: AnyGivens) => (unitRise < 7 ? 74.5 : 80)
    const sometimes = {
      ...never,
      parts: never.parts.map((part) => ({ ...part, slips: [{ code: 'full-pitch' as const, wrong: hidden }] })),
    } as typeof never
    const firsts = seeds.map((seed) => sometimes.drawGivens(drawsFrom(seed)).unitRise ?? 0)
    expect(firsts.some((rise) => rise < 7)).toBe(true)
    for (const seed of seeds) expect(draw(sometimes, seed).unitRise).toBeGreaterThanOrEqual(7)
  })

  it('has a twin with other givens, or says that every draw is alike', () => {
    const plain = numberExercise('length', 74.5, [])
    for (let seed = 0; seed < 100; seed++) expect(drawTwin(plain, seed)).not.toEqual(draw(plain, seed))
    expect(() => drawTwin({ ...plain, drawGivens: () => ({ unitRise: 7 }) }, 1)).toThrow('every draw is alike')
  })

  it('shows the givens the exercise names, and no other', () => {
    const plain = numberExercise('length', 74.5, [])
    expect(shownDraw(plain, { unitRise: 7, unitRun: 11 })).toEqual({
      exercise: 'made-up/number',
      asks: 'How much?',
      givens: { unitRise: 7 },
      parts: [{ asks: 'How much', options: null }],
    })
  })

  it('has no place for an answer in what is shown', () => {
    const shown: ShownDraw = { exercise: '', asks: '', givens: {}, parts: [] }
    // @ts-expect-error nothing beside the givens
    expect(({ ...shown, answer: 16 } satisfies ShownDraw).answer).toBe(16)
    // @ts-expect-error no given has the name of an answer
    expect(({ ...shown, givens: { miter: 16 } } satisfies ShownDraw).givens.miter).toBe(16)
    // @ts-expect-error nothing of a part depends on the draw
    expect(({ asks: '', options: null, right: 16 } satisfies ShownDraw['parts'][number]).right).toBe(16)
  })
})
