import type { Pass } from '../../../shared/agronomy/ground'

/** What the machine of a pass is called. */
export const PASS_MACHINE: Record<Pass, string> = {
  dig: 'digger',
  rocks: 'rock picker',
  plant: 'planter',
  roll: 'roller',
  spray: 'sprayer',
}

/** 'Crow Corner', 'Crow Corner and Lantern', 'Crow Corner, Lantern and 4 more'. */
export function sayNames(names: readonly string[]): string {
  if (names.length <= 1) return names.join('')
  if (names.length === 2) return names.join(' and ')
  return `${names.slice(0, 2).join(', ')} and ${names.length - 2} more`
}
