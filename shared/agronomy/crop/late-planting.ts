/** Arithmetic of crop-insurance dates. The dates and rates are the county's of a year, and the insurer's word counts. */

export interface LatePlanting {
  /** `YYYY-MM-DD` */
  finalDate: string
  /** days behind it in which cover shrinks */
  lateDays: number
  /** of the guarantee, lost a day, percent */
  lossPctPerDay: number
  /** share of the guarantee once that is over, percent; null: not known */
  preventedPct: number | null
}

const DAY = /^\d{4}-\d{2}-\d{2}$/

function dayNumber(day: string): number {
  const time = Date.parse(`${day}T00:00:00Z`)
  if (!DAY.test(day) || Number.isNaN(time) || new Date(time).toISOString().slice(0, 10) !== day) throw new RangeError(`The day (${day}) must be a date as YYYY-MM-DD`)
  return Math.round(time / 86_400_000)
}

/** Days from one date to another, as the calendar counts them. @throws {RangeError} when either is no date */
export function daysBetween(from: string, to: string): number {
  return dayNumber(to) - dayNumber(from)
}

/** The date a number of days behind another. @throws {RangeError} when it is no date or the days are not whole */
export function dayAfter(day: string, days: number): string {
  if (!Number.isInteger(days)) throw new RangeError(`The days (${days}) must be whole`)
  return new Date((dayNumber(day) + days) * 86_400_000).toISOString().slice(0, 10)
}

/**
 * Share of the guarantee that planting on a day keeps: 1 up to the final date, less by the rate a day in the late
 * period (7 CFR 457 as UMN Extension 2020 explains it).
 * @returns 0 to 1; null behind the late period where the prevented-planting share is not known
 * @throws {RangeError} when a date is none or a figure out of range
 */
export function guaranteeShare(plantedOn: string, { finalDate, lateDays, lossPctPerDay, preventedPct }: LatePlanting): number | null {
  if (!(lateDays >= 0) || !(lossPctPerDay >= 0 && lossPctPerDay * lateDays <= 100)) throw new RangeError(`A late period of ${lateDays} days at ${lossPctPerDay} % a day is none`)
  const late = daysBetween(finalDate, plantedOn)
  if (late <= 0) return 1
  if (late <= lateDays) return 1 - late * lossPctPerDay / 100
  return preventedPct === null ? null : preventedPct / 100
}
