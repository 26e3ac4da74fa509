import { TZDate } from '@date-fns/tz'
import type { LocalDay } from '../types/ids'

/** Days and hours as they are called at a farm. The zone is always an argument. */

/** The calendar day of an instant in a zone, `YYYY-MM-DD`. */
export function localDayOf(instant: Date, zone: string): LocalDay {
  const local = new TZDate(instant.getTime(), zone)
  const two = (value: number) => String(value).padStart(2, '0')
  return `${local.getFullYear()}-${two(local.getMonth() + 1)}-${two(local.getDate())}` as LocalDay
}

/** The instants at which a local day begins and ends: 23, 24 or 25 hours apart. */
export function boundsOfLocalDay(day: LocalDay, zone: string): { from: Date, to: Date } {
  const [year, month, date] = day.split('-').map(Number) as [number, number, number]
  return { from: startOfDay(year, month, date, zone), to: startOfDay(year, month, date + 1, zone) }
}

function startOfDay(year: number, month: number, date: number, zone: string): Date {
  return new Date(new TZDate(year, month - 1, date, 0, 0, 0, zone).getTime())
}
