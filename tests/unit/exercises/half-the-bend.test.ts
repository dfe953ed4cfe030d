import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { miter } from '@/lib/calculators/cutting/miter'
import { defaultPrecision } from '@/lib/calculators/fields'
import { draw, drawTwin, shownDraw } from '@/lib/exercises/draw'
import { orderOf, type AnyGivens, type Exercise, type NumberPart } from '@/lib/exercises/exercise'
import { inOrder, sawSetting, settingAndFace } from '@/lib/exercises/half-the-bend'
import { judge, type Judgement, type Reply } from '@/lib/exercises/judge'
import { isRefusal } from '@/lib/trade/refusal'
import { showDial } from '@/lib/trade/quantity/dial'
import { degreesMath } from '../../support/degrees-math'

const seeds = Array.from({ length: 500 }, (_, seed) => seed * 7919)
const exercises: readonly Exercise[] = [sawSetting, settingAndFace, inOrder]
const math = degreesMath()

/** An angle as people write it down. */
const written = (degrees: number): string[] => [
  degrees.toFixed(1),
  degrees.toFixed(2),
  `${degrees.toFixed(4)} deg`,
  `${degrees.toFixed(3)}°`,
  ...[1 / 4, 1 / 2, 1].flatMap((step) => [showDial(degrees, step), showDial(degrees, step).replace('°', '')]),
  showDial(degrees, 1 / 4)
    .replace(' 1/4', '¼')
    .replace(' 3/4', '¾')
    .replace(' 1/2', '½'),
  `${Math.floor(degrees)}° ${((degrees % 1) * 60).toFixed(2)}'`.replace("60.00'", "59.99'"),
  `${degrees.toFixed(6)}*1`,
]

const firstNumber = <G>({ parts }: { parts: readonly unknown[] }) => parts[0] as NumberPart<G>

/** A numeric part beside replies that are right in every other part. */
function withNumber<G extends AnyGivens>(exercise: Exercise<G>, givens: G) {
  const others = exercise.parts.slice(1).map((part) => part.solve(givens) as Reply)
  return (typed: string) => judge(exercise, givens, [typed, ...others])
}

const numberVerdict = (judgement: Judgement) => (judgement.read ? judgement.parts[0] : judgement.says)

describe.each([sawSetting, settingAndFace] as readonly Exercise[])('$id', (exercise) => {
  const part = firstNumber<AnyGivens>(exercise)

  it('judges the right answer right, however it is written', () => {
    for (const givens of seeds.map((seed) => draw(exercise, seed))) {
      const judged = withNumber(exercise, givens)
      for (const typed of written(part.solve(givens)))
        expect([typed, judged(typed)]).toMatchObject([typed, { good: true }])
    }
  })

  it('judges what every slip gives wrong, and names that slip alone', () => {
    const named = new Set<string>()
    for (const givens of seeds.map((seed) => draw(exercise, seed))) {
      const judged = withNumber(exercise, givens)
      for (const { code, wrong } of part.slips) {
        const value = wrong(givens)
        if (value === null) continue
        named.add(code)
        for (const typed of written(value))
          expect([typed, numberVerdict(judged(typed))]).toEqual([typed, { good: false, slips: [code] }])
      }
    }
    expect(named).toEqual(new Set(part.slips.map(({ code }) => code)))
  })

  it('keeps slips and answer further apart than the tolerance', () => {
    fc.assert(
      fc.property(fc.integer(), (seed) => {
        const givens = draw(exercise, seed)
        const wrongs = part.slips.map((slip) => slip.wrong(givens)).filter((value) => value !== null)
        const all = [part.solve(givens), ...wrongs]
        for (const [at, a] of all.entries())
          for (const b of all.slice(at + 1)) expect(Math.abs(a - b)).toBeGreaterThan(0.5)
      }),
      { numRuns: 500 },
    )
  })
})

describe.each(exercises)('$id', (exercise) => {
  it('draws the same from the same seed, and mostly otherwise from another', () => {
    const drawn = seeds.map((seed) => JSON.stringify(draw(exercise, seed)))
    expect(seeds.map((seed) => JSON.stringify(draw(exercise, seed)))).toEqual(drawn)
    expect(new Set(drawn).size).toBeGreaterThan(60)
  })

  it('has a twin with other givens for every draw', () => {
    for (const seed of seeds) expect(drawTwin(exercise, seed)).not.toEqual(draw(exercise, seed))
  })

  it('shows neither the answer nor its rounding', () => {
    const constant = new Set<string>()
    for (const seed of seeds.slice(0, 200)) {
      const givens = draw(exercise, seed)
      const shown = shownDraw(exercise, givens)
      constant.add(JSON.stringify({ ...shown, givens: null }))
      for (const secret of secretsOf(exercise, givens))
        expect(tokens(JSON.stringify(shown.givens))).not.toContain(secret)
      expect(Object.keys(shown.givens).sort()).toEqual([...exercise.gives].sort())
    }
    // All beside the givens is alike in every draw, so it tells nothing.
    expect(constant.size).toBe(1)
  })
})

/** Every word and number of a text. */
const tokens = (json: string) => json.match(/[\w.+-]+/g) ?? []

/** The solution as it might stand in a payload: in full, at five significant digits, to the dial. */
function secretsOf(exercise: Exercise, givens: AnyGivens): string[] {
  return exercise.parts.flatMap((part) => {
    if (part.kind === 'choice') return [part.solve(givens)]
    const numbers = [part.solve(givens)].flat()
    if (part.kind === 'order') expect(JSON.stringify(givens)).not.toContain(JSON.stringify(orderOf(numbers)))
    return numbers.flatMap((n) => [String(n), n.toPrecision(5), String(Number(n.toPrecision(5))), showDial(n, 0.25)])
  })
}

describe('the slips of a saw setting', () => {
  const wrongs = <G extends AnyGivens>(exercise: Exercise<G>, givens: G) =>
    Object.fromEntries(firstNumber<G>(exercise).slips.map(({ code, wrong }) => [code, wrong(givens)]))
  const close = (value: number) => expect.closeTo(value, 3)

  it('give their printed numbers on a stair of 7 on 11', () => {
    const stair = { unitRise: 7, unitRun: 11, sawAtSquare: 0 as const }
    expect(firstNumber<typeof stair>(sawSetting).solve(stair)).toBeCloseTo(16.2356, 4)
    expect(wrongs(sawSetting, stair)).toEqual({
      'full-pitch': close(32.4712),
      'run-over-rise': close(28.7644),
      'wrong-dial': close(73.7644),
      'halved-twice': close(8.1178),
      radians: close(0.2834),
    })
  })

  it('give their printed numbers between two flights, the readings off the other end of the dial too', () => {
    const bars = { slopeBelow: 32.4712, slopeAbove: 28.443, sawAtSquare: 0 as const }
    const between = {
      'full-pitch': close(4.0282),
      'half-of-plumb': null,
      'wrong-dial': close(87.9859),
      'halved-twice': close(1.00705),
      'added-pitches': close(30.4571),
      'averaged-pitches': close(15.2286),
    }
    expect(firstNumber<typeof bars>(settingAndFace).solve(bars)).toBeCloseTo(2.0141, 4)
    expect(wrongs(settingAndFace, bars)).toEqual(between)
    expect(wrongs(settingAndFace, { ...bars, sawAtSquare: 90 })).toMatchObject({
      'full-pitch': close(85.9718),
      'wrong-dial': close(2.0141),
      'added-pitches': close(59.5429),
    })
  })
})

describe('the solutions', () => {
  it('are those of mathjs in degrees, from the given stair', () => {
    for (const givens of seeds.map((seed) => draw(sawSetting, seed))) {
      const { unitRise, unitRun, sawAtSquare } = givens
      const typed = `${sawAtSquare === 0 ? '' : '90 - '}atan(${unitRise}/${unitRun})/2`
      expect(firstNumber<typeof givens>(sawSetting).solve(givens)).toBeCloseTo(Number(math.evaluate(typed)), 9)
      expect(judge(sawSetting, givens, [typed])).toMatchObject({ good: true })
      expect(unitRise / unitRun).toBeGreaterThanOrEqual(Number(math.evaluate('tan(28)')))
      expect(unitRise / unitRun).toBeLessThanOrEqual(Number(math.evaluate('tan(40)')))
    }
  })

  it("are the miter calculator's, face included", () => {
    const faces = new Set<unknown>()
    for (const givens of seeds.map((seed) => draw(settingAndFace, seed))) {
      const solved = miter.solve({ ...givens, depth: 1.5, dialStep: 0.25 }, defaultPrecision)
      if (isRefusal(solved)) throw new Error(solved.message)
      const reading = givens.sawAtSquare === 0 ? solved.sawSquareIs0 : solved.sawSquareIs90
      const face = solved.longPointFace
      faces.add(face)
      expect(judge(settingAndFace, givens, [`${reading}`, face])).toMatchObject({ good: true })
      const other = face === 'top' ? 'underside' : 'top'
      expect(judge(settingAndFace, givens, [`${reading}`, other])).toEqual({
        read: true,
        good: false,
        parts: [{ good: true }, { good: false, slips: ['wrong-long-face'] }],
      })
    }
    expect(faces).toEqual(new Set(['top', 'underside']))
  })

  it('put knuckles in the order of half their bends; the other dial and the sum of slopes are named', () => {
    for (const givens of seeds.map((seed) => draw(inOrder, seed))) {
      const { knuckles, sawAtSquare } = givens
      const byReading = (work: string) =>
        orderOf(knuckles.map((knuckle) => Number(math.evaluate(work, { ...knuckle, saw: sawAtSquare }))))
      const half = 'abs(slopeBelow - slopeAbove) / 2'
      const judged = (order: number[]) => judge(inOrder, givens, [order])
      expect(judged(byReading(`abs(saw - ${half})`))).toMatchObject({ good: true })
      expect(judged(byReading(`abs(90 - saw - ${half})`))).toMatchObject({ parts: [{ slips: ['wrong-dial'] }] })
      expect(judged(byReading('abs(saw - (slopeBelow + slopeAbove) / 2)'))).toMatchObject({
        parts: [{ slips: ['added-pitches'] }],
      })
      expect(judged([0, 1, 2, 3])).toMatchObject({ good: false })
    }
  })

  it.each([
    [0, [3, 2, 1, 0], { good: true }],
    [0, [0, 1, 2, 3], { good: false, slips: ['wrong-dial'] }],
    [0, [1, 0, 3, 2], { good: false, slips: ['added-pitches'] }],
    [0, [2, 3, 0, 1], { good: false, slips: [] }],
    [90, [0, 1, 2, 3], { good: true }],
    [90, [3, 2, 1, 0], { good: false, slips: ['wrong-dial'] }],
    [90, [2, 3, 0, 1], { good: false, slips: ['added-pitches'] }],
  ] as const)(
    'judge by hand-worked halves of 17, 15, 4 and 2 on a saw with square at %d: %j',
    (saw, order, verdict) => {
      const knuckles = [
        { slopeBelow: 34, slopeAbove: 0 },
        { slopeBelow: 0, slopeAbove: 30 },
        { slopeBelow: 36, slopeAbove: 28 },
        { slopeBelow: 28, slopeAbove: 32 },
      ]
      const judged = judge(inOrder, { knuckles, sawAtSquare: saw }, [order])
      expect(judged).toEqual({ read: true, good: verdict.good, parts: [verdict] })
    },
  )
})
