import type { Pass } from '../../../shared/agronomy/ground'

/** What the machine of a pass is called. */
export const PASS_MACHINE: Record<Pass, string> = {
  dig: 'digger',
  rocks: 'rock picker',
  plant: 'planter',
  roll: 'roller',
  spray: 'sprayer',
}

/** Length of a wait, as people say it. */
export function sayAge(milliseconds: number): string {
  const hours = Math.round(milliseconds / 3_600_000)
  return hours < 48 ? `${hours} hours` : `${Math.round(hours / 24)} days`
}
