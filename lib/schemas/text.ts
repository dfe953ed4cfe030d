import { z } from './zod'

// A lone half of a surrogate pair cannot be stored as UTF-8: it would come back as another character.
const loneSurrogate = /\p{Surrogate}/u

/**
 * Text a person types: kept to the letter, never blank.
 * @param name how the screen calls the field, for the sentence when it is missing.
 * @param longest greatest length in characters as JavaScript counts them.
 */
export function typedText(name: string, longest: number) {
  return optionalText(name, longest).refine((text) => text.trim() !== '', { message: `${name} is missing.` })
}

/** Text that may stay empty. */
export function optionalText(name: string, longest: number) {
  return z
    .string({ error: `${name} is missing.` })
    .max(longest, { message: `${name} may have at most ${longest} characters.` })
    .refine((text) => !loneSurrogate.test(text), { message: `${name} holds half a character.` })
}

/** An e-mail address, compared without regard to case. */
export const emailField = z
  .string({ error: 'The e-mail address is missing.' })
  .trim()
  .toLowerCase()
  .max(254, { message: 'The e-mail address is longer than 254 characters.' })
  .pipe(z.email({ error: 'Write the e-mail address as name@place.example.' }))

/** The id of a row. A text that is no id is answered like a missing row. */
export const idField = z.uuid({ error: 'There is nothing of that id.' })

/** Number of the row's state as it was read; somebody else's save in between raises it. */
export const versionField = z
  .int({ error: 'Say which version was read.' })
  .min(1, { message: 'Say which version was read.' })

/** A calendar day as YYYY-MM-DD, without a zone: the day on the measurer's own wall. */
export const dayField = z.iso.date({ error: 'Write the day as 2026-03-31.' })
