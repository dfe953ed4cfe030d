import { z } from './zod'

export const shortestPassword = 15
export const longestPassword = 128

/** Words that everybody tries first, and this trade's own. */
const commonWords = [
  'password',
  'passwort',
  'passcode',
  'passphrase',
  'letmein',
  'welcome',
  'iloveyou',
  'sunshine',
  'princess',
  'football',
  'baseball',
  'superman',
  'batman',
  'dragon',
  'monkey',
  'master',
  'shadow',
  'michael',
  'jordan',
  'trustno',
  'starwars',
  'whatever',
  'changeme',
  'secret',
  'administrator',
  'admin',
  'login',
  'default',
  'computer',
  'internet',
  'summer',
  'winter',
  'spring',
  'autumn',
  'longpoint',
  'welding',
  'welder',
  'weld',
  'handrail',
  'ironworker',
  'apprentice',
  'journeyman',
  'instructor',
  'coordinator',
  'correcthorsebatterystaple',
  'correct',
  'horse',
  'battery',
  'staple',
]

const runs = [
  'abcdefghijklmnopqrstuvwxyz',
  '01234567890',
  'qwertzuiop',
  'qwertyuiop',
  'asdfghjkl',
  'zxcvbnm',
  'yxcvbnm',
]
const bothWays = runs.flatMap((run) => [run, [...run].reverse().join('')])

/** Letters written with look-alike digits count as the letters. */
function plain(text: string): string {
  const swaps: { [digit: string]: string } = {
    '0': 'o',
    '1': 'i',
    '3': 'e',
    '4': 'a',
    '5': 's',
    '7': 't',
    '@': 'a',
    $: 's',
  }
  return text.toLowerCase().replace(/[013457@$]/g, (digit) => swaps[digit] ?? digit)
}

/** Takes out pieces of three and more that stand in a row of the alphabet, the digits or the keyboard. */
function withoutSequences(text: string): string {
  let kept = ''
  for (let at = 0; at < text.length;) {
    const length = longestRun(text.slice(at))
    if (length < 3) kept += text[at]
    at += length < 3 ? 1 : length
  }
  return kept
}

function longestRun(text: string): number {
  let length = 0
  for (const run of bothWays) {
    while (length < text.length && run.includes(text.slice(0, length + 1))) length++
  }
  return length
}

/** What a guesser still has to find once the words, runs and repeats they try first are taken out. */
function remainder(password: string, context: readonly string[]): string {
  const words = context.flatMap((text) => plain(text).split(/[^\p{L}\p{N}]+/u)).filter((word) => word.length >= 4)
  const known = [...words, ...commonWords.map(plain)].sort((a, b) => b.length - a.length)
  const without = known.reduce(
    (left, word) => left.split(word).join(' '),
    plain(withoutSequences(password.toLowerCase())),
  )
  return without.replace(/(.{1,8}?)\1+/gu, '$1').replace(/[\s\p{P}]+/gu, '')
}

/**
 * Why this password is refused, or null when it stands.
 * Composition is free: length, and enough left once common words, the person's own words, sequences and repeats go.
 */
export function passwordFault(password: string, context: readonly string[] = []): string | null {
  const length = [...password].length
  if (length < shortestPassword)
    return `A password has at least ${shortestPassword} characters: four words are easy to keep.`
  if (length > longestPassword) return `A password has at most ${longestPassword} characters.`
  const left = remainder(password, context)
  if (left.length >= 8 && new Set(left).size >= 5) return null
  return 'That one is guessed early: it is mostly common words, your own names, a sequence or a repeat. Try four unrelated words.'
}

/** A password somebody chooses, before their own words are known. */
export const newPassword = z.string({ error: 'Choose a password.' }).superRefine((password, checks) => {
  const fault = passwordFault(password)
  if (fault !== null) checks.addIssue({ code: 'custom', message: fault })
})
