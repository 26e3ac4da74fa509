import { boundsOfLocalDay, localDayOf } from '../../../shared/utils/time'
import type { LocalDay } from '../../../shared/types/ids'
import type { DbOrTransaction } from '../../db/client'
import { upsertDay } from '../../db/queries/daily-weather'
import { listHours } from '../../db/queries/hourly-weather'
import { listZonesOfPlace } from '../../db/queries/places'
import type { PlaceAnswer } from '../../gateways/weather/weather-gateway'

interface Hour { startsAt: number, rainMm: number, temperatureC: number }

/**
 * Brings the daily record up to date for every local day that a pull touched: from analysed hours as far as the day is
 * over, and from the forecast for the days ahead.
 *
 * @param over - number of the answer's hours that are over; they are stored already
 */
export function keepDays(tx: DbOrTransaction, answer: PlaceAnswer, over: number, issuedAt: Date | null, now: Date): void {
  for (const zone of listZonesOfPlace(tx, answer.placeId)) {
    const keep = (source: 'analysis' | 'forecast', days: Map<LocalDay, Hour[]>) => {
      for (const [localDay, hours] of days) {
        const temperatures = hours.map(hour => hour.temperatureC)
        upsertDay(tx, {
          placeId: answer.placeId, zone, localDay, source, hours: hours.length, issuedAt, fetchedAt: now,
          rainMm: hours.reduce((sum, hour) => sum + hour.rainMm, 0), minC: Math.min(...temperatures), maxC: Math.max(...temperatures),
        })
      }
    }
    keep('analysis', analysedDays(tx, answer, over, zone))
    keep('forecast', byDay(hoursOf(answer, over, answer.hours), zone))
  }
}

/** Whole days, also where the answer begins in the middle of one: the day's earlier hours come from the store. */
function analysedDays(tx: DbOrTransaction, answer: PlaceAnswer, over: number, zone: string): Map<LocalDay, Hour[]> {
  if (over === 0) return new Map()
  const first = boundsOfLocalDay(localDayOf(new Date(answer.startsAt * 1000), zone), zone).from
  const rows = listHours(tx, answer.placeId, first, new Date((answer.startsAt + over * 3600) * 1000))
  return byDay(rows.map(row => ({ startsAt: row.startsAt.getTime() / 1000, rainMm: row.rainMm, temperatureC: row.temperatureC })), zone)
}

function hoursOf(answer: PlaceAnswer, from: number, to: number): Hour[] {
  const run = answer.runs[0]!
  return Array.from({ length: Math.max(0, to - from) }, (_, i) => ({ startsAt: answer.startsAt + (from + i) * 3600, rainMm: run.rainMm![from + i]!, temperatureC: run.temperatureC![from + i]! }))
}

/** @param hours - in the order of time: the time zone is slow to ask, so it is asked once a day */
function byDay(hours: Hour[], zone: string): Map<LocalDay, Hour[]> {
  const days = new Map<LocalDay, Hour[]>()
  let [today, until]: [Hour[], number] = [[], -Infinity]
  for (const hour of hours) {
    if (hour.startsAt >= until) {
      const day = localDayOf(new Date(hour.startsAt * 1000), zone)
      until = boundsOfLocalDay(day, zone).to.getTime() / 1000
      days.set(day, today = [])
    }
    today.push(hour)
  }
  return days
}
