import { TZDate } from '@date-fns/tz'

/** From its first instant up to the next season's. */
export interface Season { from: Date, to: Date }

/** The season that an instant lies in: a calendar year at the farm. */
export function seasonOf(instant: Date, zone: string): Season {
  const year = new TZDate(instant.getTime(), zone).getFullYear()
  const start = (of: number) => new Date(new TZDate(of, 0, 1, zone).getTime())
  return { from: start(year), to: start(year + 1) }
}
