/** The places of the header and the phone tabs, in order. */
export const places = [
  { href: '/handbook', name: 'Handbook' },
  { href: '/handbook/handrail', name: 'Handrail' },
  { href: '/jobs', name: 'Job book' },
] as const

/** The place a path belongs to: the longest that it lies under. */
export function placeOf(path: string): string | undefined {
  const under = places.filter(({ href }) => path === href || path.startsWith(`${href}/`))
  return under.map(({ href }) => href).sort((a, b) => b.length - a.length)[0]
}
