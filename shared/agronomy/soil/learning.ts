/**
 * What a reading teaches: closed forms by which a gauge, a probe and a person's call move what the model believes
 * (soil.md 11.3 to 11.5).
 */

/** Standard normal density. */
const density = (z: number) => Math.exp(-z * z / 2) / Math.sqrt(2 * Math.PI)

/** Standard normal distribution function, by Hart's rational forms (West 2005), to 1e-14. @returns 0 to 1 */
export function normalShare(z: number): number {
  if (Number.isNaN(z)) throw new RangeError('The normal distribution needs a number')
  const x = Math.abs(z)
  if (x > 37) return z > 0 ? 1 : 0
  const e = Math.exp(-x * x / 2)
  let tail: number
  if (x < 7.07106781186547) {
    const above = ((((((0.0352624965998911 * x + 0.700383064443688) * x + 6.37396220353165) * x + 33.912866078383) * x + 112.079291497871) * x + 221.213596169931) * x + 220.206867912376)
    const below = (((((((0.0883883476483184 * x + 1.75566716318264) * x + 16.064177579207) * x + 86.7807322029461) * x + 296.564248779674) * x + 637.333633378831) * x + 793.826512519948) * x + 440.413735824752)
    tail = e * above / below
  }
  else {
    tail = e / (x + 1 / (x + 2 / (x + 3 / (x + 4 / (x + 0.65))))) / 2.506628274631
  }
  return z > 0 ? 1 - tail : tail
}

/** A belief about a quantity: mean and standard deviation, or median and spread of the logarithm. */
export interface Belief { value: number, spread: number }

function spreads(...values: number[]): void {
  if (values.some(value => !(value > 0) || !Number.isFinite(value))) throw new RangeError(`The spreads (${values.join(', ')}) must be above 0`)
}

/**
 * Rain after a gauge has been read: log-normal, weighed by precision. A gauge replaces the grid, it is not averaged
 * with it: its weight comes out at 0.9 and more.
 *
 * @param prior - median in mm, above 0, and spread of the logarithm
 * @param gauge - the same of the reading
 * @returns the same
 * @throws {RangeError} when a median or a spread is not above 0
 */
export function rainWithGauge(prior: Belief, gauge: Belief): Belief {
  spreads(prior.value, prior.spread, gauge.value, gauge.spread)
  const weight = prior.spread ** 2 / (prior.spread ** 2 + gauge.spread ** 2)
  return { value: prior.value * (gauge.value / prior.value) ** weight, spread: prior.spread * Math.sqrt(1 - weight) }
}

/**
 * A quantity after a probe: the Kalman gain of one reading.
 * @param prior - mean and standard deviation, in any one unit
 * @param probe - reading and its standard deviation
 * @throws {RangeError} when a spread is not above 0 or a value NaN
 */
export function withProbe(prior: Belief, probe: Belief): Belief {
  spreads(prior.spread, probe.spread)
  if (Number.isNaN(prior.value + probe.value)) throw new RangeError('Prior and reading must be numbers')
  const gain = prior.spread ** 2 / (prior.spread ** 2 + probe.spread ** 2)
  return { value: prior.value + gain * (probe.value - prior.value), spread: prior.spread * Math.sqrt(1 - gain) }
}

/** How exactly a person's hand calls the ground, m³/m³, and how often a call has other reasons. Settings (soil.md 11.4). */
export const CALL_SPREAD = 0.02
export const CALL_MISTAKES = 0.05

export type Call = 'fit' | 'not-fit'

/**
 * Chance of a call when the top 100 mm hold `over` more than the fit level: ε + (1 − 2ε)·Φ(∓over/σ).
 * @param over - m³/m³, negative when drier than the fit level
 * @throws {RangeError} when it is NaN
 */
export function chanceOfCall(call: Call, over: number, mistakes = CALL_MISTAKES, spread = CALL_SPREAD): number {
  return mistakes + (1 - 2 * mistakes) * normalShare((call === 'fit' ? -over : over) / spread)
}

/**
 * What a call teaches when the belief is normal: probit moment matching (soil.md 11.4).
 *
 * @param over - belief about water over the fit level, m³/m³
 * @returns the belief behind the call, and how likely the call was before it
 * @throws {RangeError} when a spread is not above 0
 */
export function withCall(over: Belief, call: Call, mistakes = CALL_MISTAKES, spread = CALL_SPREAD): Belief & { chance: number } {
  spreads(over.spread, spread)
  const sign = call === 'fit' ? -1 : 1
  const both = Math.sqrt(over.spread ** 2 + spread ** 2)
  const z = sign * over.value / both
  const chance = mistakes + (1 - 2 * mistakes) * normalShare(z)
  const pull = (1 - 2 * mistakes) * density(z) / chance
  return {
    chance,
    value: over.value + sign * over.spread ** 2 / both * pull,
    spread: Math.sqrt(over.spread ** 2 - over.spread ** 4 / both ** 2 * (pull ** 2 + pull * z)),
  }
}
