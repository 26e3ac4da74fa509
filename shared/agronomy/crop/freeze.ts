/** Freeze risk of young crops (crop.md 10). Damage is judged in the field, three to five days later. */

export type FreezeRisk = 'none' | 'watch' | 'damage-likely'

/** Air temperature, °F: watch at 32; soybean and bean once emerged at 30; corn once emerged at 28 (UMN 2020). */
const WATCH_F = 32
const DAMAGE_F = { 'soybean': 30, 'dry bean': 30, 'corn': 28 } as const

/** Air temperatures at which seedlings show damage, °C, first and worst (a Canadian crop-advice page). */
export const SEEDLING_DAMAGE_C = {
  wheat: [-3.9, -5.5], oats: [-3.3, -4.4], barley: [-2.8, -3.9], canola: [-3, -9], soybean: [0, -1], corn: [0, -1],
} as const

/**
 * @param emerged - false: the growing point is safe under the ground
 * @throws {RangeError} when the temperature is NaN
 */
export function freezeRisk(minimumF: number, crop: keyof typeof DAMAGE_F, emerged: boolean): FreezeRisk {
  if (Number.isNaN(minimumF)) throw new RangeError('The minimum must be a number of °F')
  if (!emerged || minimumF > WATCH_F) return 'none'
  return minimumF <= DAMAGE_F[crop] ? 'damage-likely' : 'watch'
}
