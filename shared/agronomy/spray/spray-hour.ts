import { offAxisDeg } from '../weather/wind-direction'
import type { InversionChance } from '../weather/inversion'

/**
 * Tests an hour against a material's limits (spray.md 1.5, 2.6, 3.1, 4). Every limit comes from the product's own
 * record with the source that it names; the label is the law, and wind and inversion are judged at the field.
 */
export interface SprayLimits {
  /** m/s at the boom; null: no limit is named */
  leastWindMs: Limit | null
  mostWindMs: Limit | null
  /** m/s by which a gust may be above the most wind before the hour is closed */
  gustOverMs: Limit | null
  /** half-width of the sector that must not be downwind, degrees; used with each sensitive bearing */
  downwindHalfDeg: Limit | null
  inversion: { closes: 'likely' | 'possible', source: string } | null
  /** °C */
  mostDeltaTC: Limit | null
  leastTemperatureC: Limit | null
  mostTemperatureC: Limit | null
  /** largest chance of rain before it is fast, 0 to 1 */
  mostRainChance: Limit | null
  /** most that may be expected before it is fast, mm */
  mostRainMm: Limit | null
  /** chance of a runoff-producing rain ahead, 0 to 1 */
  mostRunoffChance: Limit | null
  daylight: { source: string } | null
}
export interface Limit { value: number, source: string }

export interface SprayConditions {
  /** m/s, the two cautious readings at the boom */
  wind: { forLeastMs: number, forMostMs: number }
  /** at 10 m, m/s; null: not known */
  gustMs: number | null
  windFromDeg: number
  /** bearings from the field to what must not be hit, degrees */
  sensitiveDeg: readonly number[]
  inversion: InversionChance
  deltaTC: number
  temperatureC: number
  /** until the product is fast; null: the forecast does not reach so far */
  rain: { largestChance: number, sumMm: number } | null
  /** null: not known */
  runoffChance: number | null
  inDaylight: boolean
}

/** One reason that closes an hour: what it is, what was found, the limit and where that comes from. */
export interface Blocked { what: SprayReason, found: number | null, limit: number | null, source: string }
export type SprayReason = 'wind-low' | 'wind-high' | 'gust' | 'downwind' | 'inversion' | 'delta-t' | 'too-cold' | 'too-warm' | 'rain-soon' | 'runoff' | 'night' | 'not-known'

/**
 * Every reason that closes the hour; none: a Go by these figures. What a limit needs and nobody knows closes it too.
 *
 * @throws {RangeError} when wind, temperature or Delta T is NaN
 */
export function blockedBy(conditions: SprayConditions, limits: SprayLimits): Blocked[] {
  const { wind, gustMs, windFromDeg, sensitiveDeg, deltaTC, temperatureC, rain, runoffChance } = conditions
  if (Number.isNaN(wind.forLeastMs + wind.forMostMs + deltaTC + temperatureC)) throw new RangeError('Wind, temperature and Delta T of the hour must be known')
  const reasons: Blocked[] = []
  const test = (what: SprayReason, limit: Limit | null, found: number | null, closes: (found: number, value: number) => boolean) => {
    if (!limit) return
    if (found === null) reasons.push({ what: 'not-known', found, limit: limit.value, source: limit.source })
    else if (closes(found, limit.value)) reasons.push({ what, found, limit: limit.value, source: limit.source })
  }
  const under = (found: number, value: number) => found < value
  const over = (found: number, value: number) => found > value
  test('wind-low', limits.leastWindMs, wind.forLeastMs, under)
  test('wind-high', limits.mostWindMs, wind.forMostMs, over)
  const { mostWindMs, gustOverMs } = limits
  if (mostWindMs && gustOverMs) test('gust', { value: mostWindMs.value + gustOverMs.value, source: gustOverMs.source }, gustMs, over)
  for (const bearing of sensitiveDeg) test('downwind', limits.downwindHalfDeg, offAxisDeg(windFromDeg, bearing), (found, value) => found <= value)
  if (limits.inversion && (conditions.inversion === 'likely' || conditions.inversion === limits.inversion.closes)) reasons.push({ what: 'inversion', found: null, limit: null, source: limits.inversion.source })
  test('delta-t', limits.mostDeltaTC, deltaTC, over)
  test('too-cold', limits.leastTemperatureC, temperatureC, under)
  test('too-warm', limits.mostTemperatureC, temperatureC, over)
  test('rain-soon', limits.mostRainChance, rain && rain.largestChance, over)
  if (rain) test('rain-soon', limits.mostRainMm, rain.sumMm, over)
  test('runoff', limits.mostRunoffChance, runoffChance, over)
  if (limits.daylight && !conditions.inDaylight) reasons.push({ what: 'night', found: null, limit: null, source: limits.daylight.source })
  return reasons
}

/** A row of hours without a reason against them. */
export interface GoRun { from: number, hours: number }

/**
 * Runs of Go hours, in order.
 * @param open - one element an hour
 * @param leastHours - shorter runs are left out; whole, at least 1
 * @throws {RangeError} when the least is none
 */
export function goRuns(open: readonly boolean[], leastHours = 1): GoRun[] {
  if (!Number.isInteger(leastHours) || leastHours < 1) throw new RangeError(`The least hours (${leastHours}) must be whole and at least 1`)
  const runs: GoRun[] = []
  for (const [hour, go] of open.entries()) {
    const last = runs.at(-1)
    if (!go) continue
    if (last && last.from + last.hours === hour) last.hours++
    else runs.push({ from: hour, hours: 1 })
  }
  return runs.filter(({ hours }) => hours >= leastHours)
}
