import type { RailSticks } from '@/lib/trade/rail/types'

/** How many sticks, and whether fewer could do. */
export function sticksText({ sticks, bound, proved }: Pick<RailSticks, 'sticks' | 'bound' | 'proved'>): string {
  const many = `${sticks} ${sticks === 1 ? 'stick' : 'sticks'}`
  return proved ? `${many}, and no fewer can do` : `${many}; ${bound} not ruled out`
}
