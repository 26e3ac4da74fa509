/**
 * Growing degree days.
 *
 * The same day gives another figure by another method, so a sum is nothing without method, base, cap and unit
 * (crop.md T9): `DegreeDaySum` carries them. Temperatures and results in one unit, °C or °F, and never mixed.
 */

export type DegreeDayMethod = 'clip-then-average' | 'average-then-clip' | 'single-sine'

export interface DegreeDayRule {
  method: DegreeDayMethod
  /** lower threshold */
  base: number
  /** upper threshold; null: none */
  cap: number | null
  unit: 'F' | 'C'
}

/** Thresholds by crop (crop.md 1.1 and 1.2): corn and soybean 86/50 °F, small grains base 32 °F, sugarbeet 34/86 °F. */
export const DEGREE_DAY_RULES = {
  'corn': { method: 'clip-then-average', base: 50, cap: 86, unit: 'F' },
  'soybean': { method: 'clip-then-average', base: 50, cap: 86, unit: 'F' },
  'small-grain': { method: 'clip-then-average', base: 32, cap: 70, unit: 'F' },
  'sugarbeet': { method: 'clip-then-average', base: 34, cap: 86, unit: 'F' },
} as const satisfies Record<string, DegreeDayRule>

function checkDay(min: number, max: number, base: number, cap: number | null): void {
  if (!(min <= max) || !Number.isFinite(min) || !Number.isFinite(max)) throw new RangeError(`The day's minimum (${min}) must be at most its maximum (${max})`)
  if (!Number.isFinite(base) || (cap !== null && !(cap > base))) throw new RangeError(`The cap (${cap}) must be above the base (${base})`)
}

const clip = (value: number, low: number, high: number | null) => Math.min(Math.max(value, low), high ?? Infinity)

/**
 * Clip each extreme, then average: the corn standard (Gilmore & Rogers 1958; Barger 1969), Method 2 of McMaster &
 * Wilhelm 1997.
 * @param cap - null: none
 * @throws {RangeError} when the extremes are swapped or not finite, or the cap is not above the base
 */
export function degreeDaysClipped(min: number, max: number, base: number, cap: number | null): number {
  checkDay(min, max, base, cap)
  return (clip(min, base, cap) + clip(max, base, cap)) / 2 - base
}

/** Average, then clip: Method 1 of McMaster & Wilhelm 1997. @throws {RangeError} as above */
export function degreeDaysAveraged(min: number, max: number, base: number, cap: number | null): number {
  checkDay(min, max, base, cap)
  return clip((min + max) / 2, base, cap) - base
}

/**
 * Single sine with a horizontal cut-off (Baskerville & Emin 1969, Ecology 50:514).
 * @throws {RangeError} as above
 */
export function degreeDaysSine(min: number, max: number, base: number, cap: number | null): number {
  checkDay(min, max, base, cap)
  const upper = cap ?? Infinity
  if (max <= base) return 0
  if (min >= upper) return upper - base
  const mean = (max + min) / 2
  const half = (max - min) / 2
  const rises = min < base ? Math.asin((base - mean) / half) : -Math.PI / 2
  const meets = max > upper ? Math.asin((upper - mean) / half) : Math.PI / 2
  // Over half a turn of the sine: below the base, between the thresholds, above the cap.
  const between = (mean - base) * (meets - rises) + half * (Math.cos(rises) - Math.cos(meets))
  const above = max > upper ? (upper - base) * (Math.PI / 2 - meets) : 0
  return (between + above) / Math.PI
}

/**
 * From hourly temperatures: their mean within the thresholds.
 * @param temperatures - of one day, 24 of them or fewer
 * @returns the degree days and how many hours they rest on; fewer than 24 is a day with a gap
 * @throws {RangeError} without hours or with one that is not finite
 */
export function degreeDaysHourly(temperatures: ArrayLike<number>, base: number, cap: number | null): { degreeDays: number, hours: number } {
  const values = Array.from(temperatures)
  if (values.length === 0 || values.some(value => !Number.isFinite(value))) throw new RangeError('The day needs at least one hour, each temperature finite')
  checkDay(0, 0, base, cap)
  return { degreeDays: values.reduce((sum, value) => sum + clip(value, base, cap) - base, 0) / values.length, hours: values.length }
}

/** Degree days of a day by a rule. @throws {RangeError} as above */
export function degreeDays(min: number, max: number, { method, base, cap }: DegreeDayRule): number {
  switch (method) {
    case 'clip-then-average': return degreeDaysClipped(min, max, base, cap)
    case 'average-then-clip': return degreeDaysAveraged(min, max, base, cap)
    case 'single-sine': return degreeDaysSine(min, max, base, cap)
  }
}

export interface DegreeDaySum extends DegreeDayRule {
  sum: number
  /** `YYYY-MM-DD`; null: no day */
  firstDay: string | null
  lastDay: string | null
  /** days of the stretch without both extremes: they add nothing, so the sum is too low by them */
  missingDays: string[]
}

/**
 * Sum over days, from the day after planting on (Ohio State AGF-101). Daily values are never rounded (crop.md T6).
 * @param days - in order; an extreme that is not known is null
 * @throws {RangeError} when the extremes of a day are swapped
 */
export function sumDegreeDays(days: readonly { day: string, min: number | null, max: number | null }[], rule: DegreeDayRule): DegreeDaySum {
  const known = days.filter(({ min, max }) => min !== null && max !== null)
  return {
    ...rule,
    sum: known.reduce((sum, { min, max }) => sum + degreeDays(min!, max!, rule), 0),
    firstDay: days[0]?.day ?? null,
    lastDay: days.at(-1)?.day ?? null,
    missingDays: days.filter(({ min, max }) => min === null || max === null).map(({ day }) => day),
  }
}

/**
 * The day on which a sum reaches a threshold, and the share of that day's heat that it took.
 * @returns null when the days don't reach it
 * @throws {RangeError} when the threshold is negative or the extremes of a day are swapped
 */
export function dayReaching(days: readonly { day: string, min: number | null, max: number | null }[], rule: DegreeDayRule, threshold: number): { day: string, share: number } | null {
  if (!(threshold >= 0)) throw new RangeError(`The threshold (${threshold}) must be at least 0`)
  let sum = 0
  for (const { day, min, max } of days) {
    if (min === null || max === null) continue
    const today = degreeDays(min, max, rule)
    if (today > 0 && sum + today >= threshold - 1e-9) return { day, share: Math.min(1, (threshold - sum) / today) }
    sum += today
  }
  return null
}

/** Degree days in °C from °F: a difference, so 32 is never subtracted. */
export function degreeDaysToC(degreeDaysF: number): number {
  return degreeDaysF * 5 / 9
}
