/** How good forecasts were, once it is known what came (spray.md 8.6, soil.md 10). Smaller is better throughout. */

/** A chance that was given, and whether it came true. */
export interface Forecasted { chance: number, happened: boolean }

function checkCases(cases: readonly Forecasted[]): void {
  if (cases.length === 0 || cases.some(({ chance }) => !(chance >= 0 && chance <= 1))) throw new RangeError('Scores need at least one forecast, each chance 0 to 1')
}

/** Brier score: mean of (chance − outcome)², 0 to 1. @throws {RangeError} without cases or with a chance outside 0 to 1 */
export function brierScore(cases: readonly Forecasted[]): number {
  checkCases(cases)
  return cases.reduce((sum, { chance, happened }) => sum + (chance - (happened ? 1 : 0)) ** 2, 0) / cases.length
}

export interface BrierParts {
  /** how far given chances lie from what came, 0: calibrated */
  reliability: number
  /** how far the groups differ from the mean, more is better */
  resolution: number
  /** what a forecast of the mean would score */
  uncertainty: number
  /** the points of a reliability diagram */
  groups: { chance: number, rate: number, n: number }[]
}

/**
 * Murphy's parts of the Brier score: reliability − resolution + uncertainty, over groups of equal chances.
 * @throws {RangeError} without cases or with a chance outside 0 to 1
 */
export function brierParts(cases: readonly Forecasted[]): BrierParts {
  checkCases(cases)
  const counts = new Map<number, { n: number, hits: number }>()
  for (const { chance, happened } of cases) {
    const group = counts.get(chance) ?? { n: 0, hits: 0 }
    counts.set(chance, { n: group.n + 1, hits: group.hits + (happened ? 1 : 0) })
  }
  const groups = [...counts].map(([chance, { n, hits }]) => ({ chance, rate: hits / n, n })).sort((a, b) => a.chance - b.chance)
  const mean = cases.filter(({ happened }) => happened).length / cases.length
  const over = (of: (group: { chance: number, rate: number }) => number) => groups.reduce((sum, group) => sum + group.n * of(group), 0) / cases.length
  return { reliability: over(({ chance, rate }) => (chance - rate) ** 2), resolution: over(({ rate }) => (rate - mean) ** 2), uncertainty: mean * (1 - mean), groups }
}

/**
 * Brier skill against always forecasting the mean of what came: 1 − BS/BS(mean).
 * @returns at most 1; null when the outcome never varied
 * @throws {RangeError} without cases or with a chance outside 0 to 1
 */
export function brierSkill(cases: readonly Forecasted[]): number | null {
  const { uncertainty } = brierParts(cases)
  return uncertainty === 0 ? null : 1 - brierScore(cases) / uncertainty
}

function checkRuns(runs: ArrayLike<number>, outcome: number, least: number): void {
  if (runs.length < least || Array.from(runs).some(run => !Number.isFinite(run)) || !Number.isFinite(outcome)) throw new RangeError(`A score needs at least ${least} runs and an outcome, all finite`)
}

/**
 * Continuous ranked probability score of runs: mean|x − y| − Σ|xi − xj|/(2n²). Hersbach 2000, Wea. Forecasting 15:559.
 *
 * @param fair - divides by 2n(n − 1) instead, which does not punish having few runs
 * @returns in the unit of the runs
 * @throws {RangeError} without runs (fair: under two) or with values that are not finite
 */
export function crps(runs: ArrayLike<number>, outcome: number, fair = false): number {
  checkRuns(runs, outcome, fair ? 2 : 1)
  const sorted = Float64Array.from(runs).sort()
  const n = sorted.length
  let [distance, spread] = [0, 0]
  for (let i = 0; i < n; i++) {
    distance += Math.abs(sorted[i]! - outcome)
    // Σ over pairs |xi − xj| = 2·Σ (2i − n + 1)·x(i), i from 0
    spread += 2 * (2 * i - n + 1) * sorted[i]!
  }
  return distance / n - spread / (2 * n * (fair ? n - 1 : n))
}

/**
 * The same for weighted runs.
 * @param weights - as many as runs, ≥ 0, with a sum above 0
 * @throws {RangeError} when they don't fit
 */
export function crpsWeighted(runs: ArrayLike<number>, weights: ArrayLike<number>, outcome: number): number {
  checkRuns(runs, outcome, 1)
  if (weights.length !== runs.length || Array.from(weights).some(weight => !(weight >= 0))) throw new RangeError('There must be one weight of at least 0 for each run')
  const order = Array.from(runs, (value, i) => ({ value, weight: weights[i]! })).sort((a, b) => a.value - b.value)
  const total = order.reduce((sum, { weight }) => sum + weight, 0)
  if (!(total > 0)) throw new RangeError('The weights must add up to more than 0')
  let [distance, spread, below] = [0, 0, 0]
  for (const { value, weight } of order) {
    const share = weight / total
    distance += share * Math.abs(value - outcome)
    // Σ over pairs wi·wj·|xi − xj| = 2·Σ w(i)·x(i)·(share below − share above)
    spread += 2 * share * value * (below - (1 - below - share))
    below += share
  }
  return distance - spread / 2
}

/** Error function by Abramowitz & Stegun 7.1.26, off by 1.5e-7 at most. */
function erf(x: number): number {
  const t = 1 / (1 + 0.3275911 * Math.abs(x))
  const value = 1 - t * Math.exp(-x * x) * (0.254829592 + t * (-0.284496736 + t * (1.421413741 + t * (-1.453152027 + t * 1.061405429))))
  return x < 0 ? -value : value
}

/**
 * The same for a normal distribution, in closed form (Gneiting et al. 2005).
 * @param spread - standard deviation, above 0
 * @throws {RangeError} when the spread is not above 0 or a value is NaN
 */
export function crpsNormal(mean: number, spread: number, outcome: number): number {
  if (!(spread > 0) || Number.isNaN(mean + outcome)) throw new RangeError(`No score for a normal of mean ${mean} and spread ${spread}: the spread must be above 0`)
  const z = (outcome - mean) / spread
  const density = Math.exp(-z * z / 2) / Math.sqrt(2 * Math.PI)
  return spread * (z * erf(z / Math.SQRT2) + 2 * density - 1 / Math.sqrt(Math.PI))
}

/** Loss of a quantile forecast: τ(y − q) above it, (1 − τ)(q − y) below. @throws {RangeError} when τ is outside 0 to 1 or a value NaN */
export function pinballLoss(tau: number, quantile: number, outcome: number): number {
  if (!(tau > 0 && tau < 1) || Number.isNaN(quantile + outcome)) throw new RangeError(`No loss for τ of ${tau}: it must lie between 0 and 1, quantile and outcome known`)
  return outcome >= quantile ? tau * (outcome - quantile) : (1 - tau) * (quantile - outcome)
}

/**
 * Score of an interval that should hold the outcome with a chance of 1 − α: width + 2/α·miss.
 * @throws {RangeError} when α is outside 0 to 1 or the ends are swapped
 */
export function intervalScore(alpha: number, low: number, high: number, outcome: number): number {
  if (!(alpha > 0 && alpha < 1) || !(low <= high) || Number.isNaN(outcome)) throw new RangeError(`No score for ${low} to ${high} with α of ${alpha}: α between 0 and 1, the ends in order`)
  return high - low + 2 / alpha * Math.max(0, low - outcome, outcome - high)
}
