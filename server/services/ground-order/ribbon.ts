import { getTimes } from 'suncalc'
import { hourlyRain } from '../../../shared/agronomy/plan/rain-line'
import type { HourlyWeather } from '../../../shared/agronomy/weather/hourly'
import type { Ribbon } from '../../../shared/types/ground-order'
import type { LocalDay } from '../../../shared/types/ids'
import { localHours } from './local-hours'
import type { PlaceWork } from './place-work'

/** Hours of a local day that must be known before its low and high are. */
const MOST_OF_A_DAY_HOURS = 18

/**
 * The weather along the axis at one place.
 *
 * @param middle - index of the run whose rain is drawn, as are the ground and the bars
 */
export function ribbon({ weather, runs, ahead }: PlaceWork, point: { latitude: number, longitude: number }, zone: string, hours: number, middle: number): Ribbon {
  const { forecast } = weather
  const { meanMm, wetShare } = hourlyRain(runs.map(run => run.weather.rainMm), hours)
  const cut = (column: Float64Array, digits: number) => Array.from(column.subarray(0, hours), value => rounded(value, digits))
  return {
    rainMm: cut(runs[middle]!.weather.rainMm, 3),
    chance: cut(wetShare, 3),
    temperatureC: cut(forecast.temperatureC, 1),
    windMs: cut(forecast.windMs, 1),
    gustMs: Array.from(forecast.gustMs.subarray(0, hours), value => Number.isNaN(value) ? null : rounded(value, 1)),
    windDirectionDeg: cut(forecast.windDirectionDeg, 0),
    days: ribbonDays(weather.past, forecast, meanMm, ahead.localDay.slice(0, hours), zone),
    nights: nights(forecast.startsAt, hours, point),
  }
}

/** Low, high and rain of each local day on the axis; today's with its hours that are over. */
function ribbonDays(past: HourlyWeather, forecast: HourlyWeather, meanRainMm: Float64Array, localDay: LocalDay[], zone: string): Ribbon['days'] {
  const over = Math.min(24, past.hours)
  const pastFrom = past.hours - over
  const pastDays = localHours(past.startsAt + pastFrom * 3600, over, zone).localDay
  return [...new Set(localDay)].map((day) => {
    const before = pastDays.flatMap((other, i) => other === day ? [pastFrom + i] : [])
    const after = localDay.flatMap((other, i) => other === day ? [i] : [])
    const degrees = [...before.map(i => past.temperatureC[i]!), ...after.map(i => forecast.temperatureC[i]!)]
    const known = degrees.length >= MOST_OF_A_DAY_HOURS
    const rainMm = before.reduce((mm, i) => mm + past.rainMm[i]!, 0) + after.reduce((mm, i) => mm + meanRainMm[i]!, 0)
    return {
      localDay: day,
      startsAt: new Date((forecast.startsAt + (after[0]! - before.length) * 3600) * 1000).toISOString(),
      minC: known ? rounded(Math.min(...degrees), 1) : null,
      maxC: known ? rounded(Math.max(...degrees), 1) : null,
      rainMm: known ? rounded(rainMm, 2) : null,
    }
  })
}

/** Sunset to sunrise, clipped to the axis. Where the sun doesn't set or rise there is no such night. */
function nights(startsAt: number, hours: number, { latitude, longitude }: { latitude: number, longitude: number }): Ribbon['nights'] {
  const [axisFrom, axisTo] = [startsAt * 1000, (startsAt + hours * 3600) * 1000]
  const sunOn = (day: number) => getTimes(new Date(axisFrom + day * 86_400_000), latitude, longitude)
  return Array.from({ length: Math.ceil(hours / 24) + 2 }, (_, day) => [sunOn(day - 1).sunset, sunOn(day).sunrise] as const)
    .flatMap(([sunset, sunrise]) => {
      if (!sunset || !sunrise) return []
      const from = Math.max(axisFrom, sunset.getTime())
      const to = Math.min(axisTo, sunrise.getTime())
      return from < to ? [{ from: new Date(from).toISOString(), to: new Date(to).toISOString() }] : []
    })
}

export function rounded(value: number, digits: number): number {
  return Number(value.toFixed(digits))
}
