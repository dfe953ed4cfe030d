import { measures, orderOf, type AnyGivens, type Exercise, type Measure, type Part, type Slip } from './exercise'
import { drawsFrom } from './seed'

/** Far more than any exercise needs; one that runs out gives what can never be judged, and says so. */
const mostDraws = 200

/** What may be shown of one part before judging: nothing that depends on the draw. */
export interface ShownPart {
  asks: string
  options: readonly string[] | null
}

/** What may be shown before judging: givens, and words that are the same in every draw. */
export interface ShownDraw {
  exercise: string
  asks: string
  givens: AnyGivens
  parts: readonly ShownPart[]
}

/**
 * Givens for one try, the same for the same seed. Drawn again while a slip would pass for the right answer, two slips
 * would look alike, or the order given is the order asked for. @throws when no draw in reach can be judged.
 */
export function draw<G extends AnyGivens>(exercise: Exercise<G>, seed: number): G {
  const draws = drawsFrom(seed)
  for (let tried = 0; tried < mostDraws; tried++) {
    const givens = exercise.drawGivens(draws)
    if (exercise.parts.every((part) => tellsApart(part, givens))) return givens
  }
  throw new Error(`${exercise.id}: no draw from seed ${seed} keeps its slips apart`)
}

/** Other givens than the draw of this seed, for a worked twin. */
export function drawTwin<G extends AnyGivens>(exercise: Exercise<G>, seed: number): G {
  const own = JSON.stringify(draw(exercise, seed))
  for (let step = 1; step <= mostDraws; step++) {
    const twin = draw(exercise, seed + step)
    if (JSON.stringify(twin) !== own) return twin
  }
  throw new Error(`${exercise.id}: every draw is alike`)
}

/** The part of a draw that may leave the server before judging: the givens the exercise names, and no other. */
export function shownDraw(exercise: Exercise, givens: AnyGivens): ShownDraw {
  return {
    exercise: exercise.id,
    asks: exercise.asks,
    givens: Object.fromEntries(exercise.gives.map((name) => [name, givens[name]])),
    parts: exercise.parts.map((part) => ({ asks: part.asks, options: part.kind === 'choice' ? part.options : null })),
  }
}

/** Whether what can be answered to this part, right or by a slip, cannot be mistaken for one another. */
export function tellsApart<G>(part: Part<G>, givens: G): boolean {
  switch (part.kind) {
    case 'number':
      return areApart(answersTo(part, givens), part.measure)
    case 'choice':
      return areDistinct(answersTo(part, givens))
    case 'order':
      return ordersApart(answersTo(part, givens), part.measure)
  }
}

/** The right answer, then the wrong one of every slip that these givens leave room for. */
function answersTo<G, Value>(part: { solve(givens: G): Value; slips: readonly Slip<G, Value>[] }, givens: G): Value[] {
  return [part.solve(givens), ...part.slips.map((slip) => slip.wrong(givens)).filter((value) => value !== null)]
}

const areDistinct = (values: readonly string[]) => new Set(values).size === values.length

/** Twice the tolerance lies between any two: rounding moves a number by one, judging forgives the other. */
const areApart = (values: readonly number[], measure: Measure) =>
  values.every((a, at) => values.slice(at + 1).every((b) => Math.abs(a - b) > 2 * measures[measure].tolerance))

/** Every way to read them gives an order of its own, beyond doubt, and none is the order they were given in. */
function ordersApart(readings: readonly (readonly number[])[], measure: Measure): boolean {
  const asGiven = [...(readings[0] ?? []).keys()]
  const orders = [asGiven, ...readings.map(orderOf)].map((order) => order.join())
  return readings.every((each) => areApart(each, measure)) && areDistinct(orders)
}
