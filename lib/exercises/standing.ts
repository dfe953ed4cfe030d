/** One fresh draw and how each judged try at it went, first to last; what could not be read is no try. */
export interface DrawnTries {
  tries: readonly boolean[]
}

export interface Standing {
  passed: boolean
  /** The lesson's calculator stays folded away: practice, not proof. */
  calculatorFolded: boolean
  /** A worked twin with other givens is offered. */
  offersTwin: boolean
  /** The misses are noted for the crew page. */
  noted: boolean
}

const foldedDraws = 2
const window = 5
const goodNeeded = 4

/**
 * Where somebody stands in one exercise, from their draws in order, the one on the table last. A draw is good when its
 * first try was; only draws that were tried count, and what was once passed stays passed.
 */
export function standing(draws: readonly DrawnTries[]): Standing {
  const misses = draws.at(-1)?.tries.filter((good) => !good).length ?? 0
  return {
    passed: hasPassed(draws.flatMap(({ tries }) => tries.slice(0, 1))),
    calculatorFolded: draws.length <= foldedDraws,
    offersTwin: misses >= 2,
    noted: misses >= 3,
  }
}

/** Whether at any moment four of the last five were good. */
const hasPassed = (firstTries: readonly boolean[]) =>
  firstTries.some(
    (_, at) => firstTries.slice(Math.max(0, at + 1 - window), at + 1).filter(Boolean).length >= goodNeeded,
  )
