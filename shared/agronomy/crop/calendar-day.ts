const DAYS_BEFORE_MONTH = [0, 31, 59, 90, 120, 151, 181, 212, 243, 273, 304, 334] as const
const DAYS_IN_MONTH = [31, 29, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31] as const

/** The last calendar day, 31 December. */
export const LAST_CALENDAR_DAY = 365

/**
 * Number of a calendar date in a year without a leap day: 1 January is 1, 31 December 365.
 *
 * Yield tables go by calendar date of any year, so 10 May must be one number in every year. 29 February counts as
 * 1 March.
 *
 * @param month - 1 to 12
 * @param day - day of the month, from 1
 * @throws {RangeError} when there is no such date
 */
export function calendarDay(month: number, day: number): number {
  const days = DAYS_IN_MONTH[month - 1]
  if (days === undefined || !Number.isInteger(day) || day < 1 || day > days) throw new RangeError(`There is no day ${day} in month ${month}`)
  return DAYS_BEFORE_MONTH[month - 1]! + day
}
