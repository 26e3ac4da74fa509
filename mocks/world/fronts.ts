/**
 * The rains and snows of the one hidden season, invented. Times are when the front passes the demo farm.
 *
 * A cold northern spring: snow into April, a wet end of April, dry days from 4 May, heavy rain on 8 May.
 */
export interface Front {
  id: number
  /** Unix hours at which it starts to rain at the reference meridian */
  startsAt: number
  hours: number
  mm: number
  /** °C that the air is colder behind it, wearing off over two days */
  coldBehind: number
  /** error of the forecasts' middle in its own spread; undefined: by chance */
  scriptedError?: number
}

const at = (iso: string) => Date.parse(iso) / 3_600_000
const front = (iso: string, hours: number, mm: number, coldBehind: number, scriptedError?: number): Omit<Front, 'id'> => ({ startsAt: at(iso), hours, mm, coldBehind, scriptedError })

export const FRONTS: Front[] = [
  front('2025-03-05T04:00Z', 11, 6, 4), front('2025-03-11T15:00Z', 6, 2, 3), front('2025-03-15T20:00Z', 13, 9, 5), front('2025-03-23T02:00Z', 9, 5, 5),
  front('2025-03-29T12:00Z', 10, 6, 4), front('2025-04-02T16:00Z', 12, 8, 5), front('2025-04-09T01:00Z', 14, 11, 9), front('2025-04-11T15:00Z', 8, 4, 6),
  front('2025-04-16T18:00Z', 6, 5, 3), front('2025-04-22T11:00Z', 9, 10.6, 3), front('2025-04-26T20:00Z', 13, 20, 4), front('2025-04-28T02:00Z', 5, 5.3, 2),
  front('2025-05-01T14:00Z', 7, 11, 2), front('2025-05-03T15:00Z', 7, 11, 1), front('2025-05-08T17:30Z', 14, 20, 4, 0.05), front('2025-05-10T22:00Z', 3, 2.2, 1),
  front('2025-05-15T19:00Z', 10, 14, 4), front('2025-05-19T08:00Z', 5, 4, 2), front('2025-05-23T22:00Z', 7, 11, 3), front('2025-05-28T12:00Z', 6, 6, 2),
  front('2025-06-02T20:00Z', 5, 13, 3), front('2025-06-07T03:00Z', 8, 9, 3), front('2025-06-12T21:00Z', 4, 16, 4), front('2025-06-18T10:00Z', 7, 7, 2),
  front('2025-06-23T22:00Z', 4, 21, 3), front('2025-06-29T05:00Z', 6, 8, 2), front('2025-07-04T23:00Z', 3, 12, 2), front('2025-07-10T20:00Z', 4, 9, 3),
].map((each, id) => ({ id, ...each }))

/** Spread of the forecasts' timing, h, by how far ahead the front is. Grows with the lead, as it does in the trade. */
export function timingSpreadHours(leadHours: number): number {
  return 0.8 + 0.08 * Math.max(0, leadHours)
}

/** Spread of the logarithm of the amount, by lead. */
export function amountSpread(leadHours: number): number {
  return 0.12 + 0.0035 * Math.max(0, Math.min(leadHours, 168))
}
