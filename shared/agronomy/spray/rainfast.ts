/** Rain between the end of spraying and the time the product is fast (spray.md 4.1). */

export interface RainHour {
  /** chance of at least 0.01 in within the hour, 0 to 1 */
  chance: number
  /** expected, mm, ≥ 0 */
  mm: number
}

/** Most that may fall in the interval, 0.02 in; a setting. */
export const MOST_RAIN_MM = 0.508

/**
 * Looks at the hours behind the end of spraying.
 *
 * @param hours - in order from the hour in which spraying ends
 * @param rainfastH - whole hours, ≥ 0; what lies in `hours` must reach so far
 * @param mostChance - in any single hour, 0 to 1
 * @returns whether it stays dry enough, the largest chance and the sum; null: the forecast does not reach so far
 * @throws {RangeError} when a figure is out of range
 */
export function staysDry(hours: readonly RainHour[], rainfastH: number, mostChance: number): { dry: boolean, largestChance: number, sumMm: number } | null {
  if (!Number.isInteger(rainfastH) || rainfastH < 0 || !(mostChance >= 0 && mostChance <= 1)) throw new RangeError(`No rainfast time of ${rainfastH} h at a chance of ${mostChance}: whole hours, chance 0 to 1`)
  if (hours.some(({ chance, mm }) => !(chance >= 0 && chance <= 1) || !(mm >= 0))) throw new RangeError('Chances must be 0 to 1 and amounts at least 0')
  if (hours.length < rainfastH) return null
  const within = hours.slice(0, rainfastH)
  const largestChance = Math.max(0, ...within.map(({ chance }) => chance))
  const sumMm = within.reduce((sum, { mm }) => sum + mm, 0)
  return { dry: largestChance <= mostChance && sumMm <= MOST_RAIN_MM, largestChance, sumMm }
}

/**
 * Chance that at least an amount falls within some hours, counted over runs.
 * @param runs - hourly mm, at least one run, all reaching so far
 * @throws {RangeError} without runs or hours
 */
export function runsReaching(runs: readonly ArrayLike<number>[], hours: number, amountMm: number): { count: number, of: number } {
  if (runs.length === 0 || !(hours > 0) || !(amountMm >= 0) || runs.some(run => run.length < hours)) throw new RangeError(`No count over ${runs.length} runs of ${hours} h: at least one run, each reaching so far`)
  const sums = runs.map(run => Array.from(run).slice(0, hours).reduce((sum, mm) => sum + mm, 0))
  return { count: sums.filter(sum => sum >= amountMm).length, of: runs.length }
}
