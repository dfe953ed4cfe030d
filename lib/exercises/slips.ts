/** What a slip is called by its cause, and what it would do to the piece. */
export interface SlipWords {
  cause: string
  consequence: string
}

/** The known slips of the exercises, by code. */
export const slips = {
  'full-pitch': {
    cause: 'You set the whole bend. Each bar takes half of it.',
    consequence: 'Put together, the bars turn twice as far as the line they follow.',
  },
  'half-of-plumb': {
    cause: 'You halved a reading from plumb. A slope is 90° less that reading; then halve it.',
    consequence: 'The knuckle turns by what is left of 90°, and the level run does not come out level.',
  },
  'run-over-rise': {
    cause: 'You put the run over the rise: that is the angle from plumb. Slope is rise over run.',
    consequence: 'The knuckle turns by what is left of 90°, and the level run does not come out level.',
  },
  'wrong-dial': {
    cause: 'You read the other scale. Look first what this saw shows at a square cut, 0 or 90.',
    consequence: 'The blade would stand nowhere near the joint: the stick is spoiled.',
  },
  'halved-twice': {
    cause: 'You halved a number that was already the half.',
    consequence: 'The bars make half of their turn, and the rail leaves its line at once.',
  },
  'added-pitches': {
    cause: 'You added the slopes. Both climb the same way: take the difference, then half.',
    consequence: 'The knuckle turns far too sharply, and the upper rail does not follow its flight.',
  },
  'averaged-pitches': {
    cause: 'You halved the average of two flights. Each knuckle takes half of its own bend.',
    consequence: 'The knuckle fits neither flight.',
  },
  radians: {
    cause: 'Your calculator was set to radians. Set it to degrees.',
    consequence: 'The saw would stand almost at square, and the rail would run straight on.',
  },
  'wrong-long-face': {
    cause: 'Long point on the wrong face. Going up the stairs: turns down, long on top; turns up, long underneath.',
    consequence: 'Put together, the bars turn the other way.',
  },
} as const satisfies Record<string, SlipWords>

export type SlipCode = keyof typeof slips
