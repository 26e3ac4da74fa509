import { LAST_CALENDAR_DAY } from './calendar-day'
import type { PlantingTable } from './planting-tables'

/**
 * Share of the highest yield that planting on a date keeps.
 *
 * Straight lines between the points of a published table, and nothing beyond them: past the last point the share is
 * not known, before the first it is 1 where the source says so and else not known.
 *
 * @param table - days rising, percent of the highest yield
 * @param day - calendar day, 1 to 365 (calendar-day.ts); every hour of a day has that day's share
 * @returns 0 to 1, or null outside the table
 * @throws {RangeError} when the day is no day of the year
 */
export function yieldShare(table: PlantingTable, day: number): number | null {
  if (!(day >= 1 && day <= LAST_CALENDAR_DAY)) throw new RangeError(`There is no calendar day ${day}`)
  const { points } = table
  const [firstDay, firstPercent] = points[0]!
  if (day < firstDay) return table.fullBefore ? firstPercent / 100 : null
  for (let i = 1; i < points.length; i++) {
    const [toDay, toPercent] = points[i]!
    if (day > toDay) continue
    const [fromDay, fromPercent] = points[i - 1]!
    return (fromPercent + (toPercent - fromPercent) * (day - fromDay) / (toDay - fromDay)) / 100
  }
  return null
}
