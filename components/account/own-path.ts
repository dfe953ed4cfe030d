/** The page to go back to: a path of ours, never another site's address. */
export function ownPath(from: string | undefined, otherwise: string): string {
  if (!from || !/^\/(?![/\\])/.test(from)) return otherwise
  try {
    const url = new URL(from, 'http://own.invalid')
    return url.origin === 'http://own.invalid' ? `${url.pathname}${url.search}${url.hash}` : otherwise
  } catch {
    return otherwise
  }
}
