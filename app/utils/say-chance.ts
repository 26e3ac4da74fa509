import type { Chance } from '#shared/types/ground-order'

/** To the nearest tenth: fifty runs can't say more. Never 0 or 100. */
export function sayChance(share: number): string {
  if (share < 0.05) return 'under 5%'
  if (share > 0.95) return 'over 95%'
  return `${Math.round(share * 10) * 10}%`
}

/** The same where there is little room. */
export function shortChance(share: number): string {
  if (share < 0.05) return '<5%'
  if (share > 0.95) return '>95%'
  return `${Math.round(share * 10) * 10}%`
}

export function sayRuns(chance: Chance): string {
  return `in ${chance.count} of ${chance.of} runs`
}
