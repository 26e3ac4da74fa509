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
 * The farm's clock for a row of hours, right on both days of the year when clocks change. All places of a farm ask for
 * the same few rows, so the last ones are kept; nobody writes to them.
 *
 * @param startsAt - Unix seconds of the first hour
 */
export function localHours(startsAt: number, hours: number, zone: string): LocalHours {
  const key = `${zone} ${startsAt} ${hours}`
  const made = kept.get(key) ?? makeLocalHours(startsAt, hours, zone)
  kept.delete(key)
  kept.set(key, made)
  if (kept.size > MOST_KEPT) kept.delete(kept.keys().next().value!)
  return made
}

const MOST_KEPT = 16
const kept = new Map<string, LocalHours>()

function makeLocalHours(startsAt: number, hours: number, zone: string): LocalHours {
  const result: LocalHours = { hourOfDay: new Uint8Array(hours), calendarDay: new Uint16Array(hours), localDay: [] }
  const offsetMs = offsetOfHours(startsAt, zone)
  let localDay = '' as LocalDay
  for (let i = 0; i < hours; i++) {
    const shown = new Date((startsAt + i * 3600) * 1000 + offsetMs(i))
    result.hourOfDay[i] = shown.getUTCHours()
    result.calendarDay[i] = calendarDay(shown.getUTCMonth() + 1, shown.getUTCDate())
    if (i === 0 || result.calendarDay[i] !== result.calendarDay[i - 1]) localDay = shown.toISOString().slice(0, 10) as LocalDay
    result.localDay.push(localDay)
  }
  return result
}

/** How far the farm's clock is ahead of UTC in each hour, ms. Asking the time zone is slow, so a day without a change is asked twice. */
function offsetOfHours(startsAt: number, zone: string): (hour: number) => number {
  const ask = (hour: number) => tzOffset(zone, new Date((startsAt + hour * 3600) * 1000)) * 60_000
  let [from, first, last] = [-Infinity, 0, 0]
  return (hour) => {
    if (hour >= from + 24) [from, first, last] = [hour, ask(hour), ask(hour + 23)]
    return first === last ? first : ask(hour)
  }
}
