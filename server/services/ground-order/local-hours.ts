import { tzOffset } from '@date-fns/tz'
import { calendarDay } from '../../../shared/agronomy/crop/calendar-day'
import type { LocalDay } from '../../../shared/types/ids'

/** What the farm's clock and calendar say in each of a row of hours. */
export interface LocalHours {
  /** 0 to 23 */
  hourOfDay: Uint8Array
  /** 1 to 365, for tables by calendar date */
  calendarDay: Uint16Array
  localDay: LocalDay[]
}

/**
 * The farm's clock for a row of hours, right on both days of the year when clocks change.
 *
 * @param startsAt - Unix seconds of the first hour
 */
export function localHours(startsAt: number, hours: number, zone: string): LocalHours {
  const result: LocalHours = { hourOfDay: new Uint8Array(hours), calendarDay: new Uint16Array(hours), localDay: [] }
  let localDay = '' as LocalDay
  for (let i = 0; i < hours; i++) {
    const instant = new Date((startsAt + i * 3600) * 1000)
    const shown = new Date(instant.getTime() + tzOffset(zone, instant) * 60_000)
    result.hourOfDay[i] = shown.getUTCHours()
    result.calendarDay[i] = calendarDay(shown.getUTCMonth() + 1, shown.getUTCDate())
    if (i === 0 || result.calendarDay[i] !== result.calendarDay[i - 1]) localDay = shown.toISOString().slice(0, 10) as LocalDay
    result.localDay.push(localDay)
  }
  return result
}
