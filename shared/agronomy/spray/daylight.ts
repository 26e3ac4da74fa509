const HOUR_MS = 3_600_000

export interface DaylightRule { afterSunriseH: number, beforeSunsetH: number }

/** Window of a day in which a label lets one spray; null where the sun doesn't rise and set or nothing is left. */
export function sprayDaylight({ sunrise, sunset }: { sunrise: Date | null, sunset: Date | null }, { afterSunriseH, beforeSunsetH }: DaylightRule): { from: Date, to: Date } | null {
  if (!(afterSunriseH >= 0) || !(beforeSunsetH >= 0)) throw new RangeError(`The hours after sunrise (${afterSunriseH}) and before sunset (${beforeSunsetH}) must be at least 0`)
  if (!sunrise || !sunset) return null
  const [from, to] = [sunrise.getTime() + afterSunriseH * HOUR_MS, sunset.getTime() - beforeSunsetH * HOUR_MS]
  return from < to ? { from: new Date(from), to: new Date(to) } : null
}

/** True when a whole hour lies inside. @throws {RangeError} when the start is no date */
export function isWholeHourWithin(startsAt: Date, window: { from: Date, to: Date } | null): boolean {
  if (Number.isNaN(startsAt.getTime())) throw new RangeError('The hour must start at a date')
  return window !== null && startsAt >= window.from && startsAt.getTime() + HOUR_MS <= window.to.getTime()
}
