/** Everybody who knocks at every route. `owner` owns the rows; `foreigner` has a shop of their own. */
export const actors = [
  'anonymous',
  'owner',
  'mate',
  'apprentice',
  'instructor',
  'coordinator',
  'foreigner',
  'foreign coordinator',
  'disabled',
] as const
export type Actor = (typeof actors)[number]
