import { TZDate } from '@date-fns/tz'

/** Work of the season counts from the first of January at the farm. */
export function seasonStart(now: Date, zone: string): Date {
  const year = new TZDate(now.getTime(), zone).getFullYear()
  return new Date(new TZDate(year, 0, 1, zone).getTime())
}
