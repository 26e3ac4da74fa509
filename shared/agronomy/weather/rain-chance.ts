/** When rain starts and how much falls, from hourly chances where no runs are at hand (spray.md 8.2 and 8.3). */

export interface StartedBy {
  /** at least: the largest single chance (hours wholly dependent) */
  lowest: number[]
  /** at most: their sum (hours that exclude each other) */
  highest: number[]
  /** as if hours knew nothing of each other; overstates, since rain hangs together */
  independent: number[]
  /** with the persistence given */
  persistent: number[]
}

/**
 * Chance that rain has started by the end of each hour, by a first-order Markov chain.
 *
 * P00 = clip(q₋q + ρ√(p₋q₋pq), max(0, q₋ + q − 1), min(q₋, q)), and its two bounds beside it.
 *
 * @param chances - of rain in each hour, 0 to 1; at least one
 * @param persistence - ρ, 0 (independent) to 1 (wholly dependent)
 * @returns arrays as long as `chances`, never falling
 * @throws {RangeError} when a chance or the persistence is outside 0 to 1, or there is no hour
 */
export function rainStartedBy(chances: readonly number[], persistence: number): StartedBy {
  if (chances.length === 0 || chances.some(p => !(p >= 0 && p <= 1))) throw new RangeError('The chances must be 0 to 1, at least one')
  if (!(persistence >= 0 && persistence <= 1)) throw new RangeError(`The persistence (${persistence}) must be 0 to 1`)
  const result: StartedBy = { lowest: [], highest: [], independent: [], persistent: [] }
  let [most, sum, noneIndependent, dry] = [0, 0, 1, 1]
  let before = 1
  for (const [hour, p] of chances.entries()) {
    const q = 1 - p
    most = Math.max(most, p)
    sum += p
    noneIndependent *= q
    const bothDry = Math.min(Math.min(before, q), Math.max(Math.max(0, before + q - 1), before * q + persistence * Math.sqrt((1 - before) * before * p * q)))
    dry = hour === 0 ? q : before > 0 ? dry * bothDry / before : 0
    before = q
    result.lowest.push(most)
    result.highest.push(Math.min(1, sum))
    result.independent.push(1 - noneIndependent)
    result.persistent.push(Math.max(result.persistent.at(-1) ?? 0, 1 - dry))
  }
  return result
}

/**
 * Hour in which the chance that rain has started reaches a share: the smallest t with F_t ≥ share.
 * @param startedBy - never falling, 0 to 1
 * @returns 1 for the first hour; null: not within them
 * @throws {RangeError} when the share is outside 0 to 1
 */
export function hourReaching(startedBy: readonly number[], share: number): number | null {
  if (!(share > 0 && share <= 1)) throw new RangeError(`The share (${share}) must be above 0 and at most 1`)
  const hour = startedBy.findIndex(chance => chance >= share - 1e-12)
  return hour < 0 ? null : hour + 1
}

/**
 * Chance of at least an amount, when what falls on wet occasions is exponential: p·exp(−x·p/m).
 *
 * The threshold that the chance itself counts from is neglected.
 *
 * @param chance - of any rain, above 0, at most 1
 * @param meanMm - mean over all occasions, dry ones too, above 0
 * @param amountMm - ≥ 0
 * @throws {RangeError} when a value is out of its range
 */
export function chanceOfAmount(chance: number, meanMm: number, amountMm: number): number {
  if (!(chance > 0 && chance <= 1) || !(meanMm > 0) || !(amountMm >= 0)) throw new RangeError(`No chance of ${amountMm} mm from a chance of ${chance} and a mean of ${meanMm} mm: chance above 0 to 1, mean above 0, amount at least 0`)
  return chance * Math.exp(-amountMm * chance / meanMm)
}

/**
 * Share of a place and of certainty that make a chance of precipitation: C × A (US National Weather Service).
 * @throws {RangeError} when either is outside 0 to 1
 */
export function areaChance(confidence: number, areaShare: number): number {
  if (!(confidence >= 0 && confidence <= 1) || !(areaShare >= 0 && areaShare <= 1)) throw new RangeError(`Confidence (${confidence}) and share of the area (${areaShare}) must be 0 to 1`)
  return confidence * areaShare
}
