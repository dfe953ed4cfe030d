import { ProblemError } from './send'

/** What to tell the person whose call did not go through: the refusal's own sentence, or that nothing was lost. */
export function sentenceOf(error: unknown): string {
  if (error instanceof ProblemError) return error.message
  return 'No answer from Longpoint. Nothing you typed is lost: check the connection and try again.'
}
