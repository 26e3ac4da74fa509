/**
 * Chance of something that happened in `count` of `of` runs: the plotting position (k + 1/3)/(n + 2/3).
 *
 * A finite number of runs never proves that a thing is sure or impossible, so this is never 0 and never 1.
 *
 * @param count - runs in which it happened, 0 to `of`
 * @param of - runs, at least 1
 * @returns above 0 and below 1
 * @throws {RangeError} when the counts are no counts
 */
export function plottingPosition(count: number, of: number): number {
  if (!Number.isInteger(count) || !Number.isInteger(of) || of < 1 || count < 0 || count > of) throw new RangeError(`${count} of ${of} is no count of runs`)
  return (count + 1 / 3) / (of + 2 / 3)
}

/**
 * Quantile by rank: the smallest value that at least the share `q` of all values do not exceed (k = ⌈q·n⌉).
 *
 * @param values - Infinity stands for 'not within the horizon' and sorts last; the order doesn't matter
 * @param q - above 0, at most 1
 * @returns one of the values
 * @throws {RangeError} when there are no values, one is NaN, or q is outside its range
 */
export function quantileByRank(values: ArrayLike<number>, q: number): number {
  if (values.length === 0 || !(q > 0 && q <= 1)) throw new RangeError(`No quantile ${q} of ${values.length} values`)
  const sorted = Float64Array.from(values).sort()
  if (Number.isNaN(sorted[sorted.length - 1]!)) throw new RangeError('A value is not a number')
  // 0.1 × 10 must be rank 1, not 2, whatever floating point makes of it.
  return sorted[Math.max(1, Math.ceil(q * sorted.length - 1e-9)) - 1]!
}
