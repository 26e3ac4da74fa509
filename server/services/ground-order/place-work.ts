import { drySpell, ordinaryDryDay } from '../../../shared/agronomy/plan/dry-spell'
import { rainOnset } from '../../../shared/agronomy/plan/rain-onset'
import type { HourlyWeather } from '../../../shared/agronomy/weather/hourly'
import { hourlyReferenceEt, sunOfHours, type SunHour } from '../../../shared/agronomy/weather/reference-evapotranspiration'
import type { UsableWeather } from './farm-inputs'
import { localHours, type LocalHours } from './local-hours'

/** Hours of past weather that the soil model is started from: it forgets its start within a month or so. */
export const PAST_HOURS = 60 * 24
/** Hours of ordinary dry weather behind the runs, within which ground that they leave wet may get fit again. */
export const SPELL_HOURS = 10 * 24

/** A place's weather made ready for the soil model: shared by all fields there. */
export interface PlaceWork {
  weather: UsableWeather
  runHours: number
  past: Stretch
  /** one element a run */
  runs: Stretch[]
  spell: Stretch
  /** the farm's clock from the first hour ahead to the end of the spell */
  ahead: LocalHours
  /** hour in which each run's rain starts; Infinity: not within the horizon */
  rainAt: Float64Array
}
interface Stretch { weather: HourlyWeather, etoMm: Float64Array, localHour: Uint8Array }

/**
 * @param runs - number of runs to use, at most as many as the place has
 * @param hours - horizon of the order
 * @throws {RangeError} when the weather has a gap
 */
export function placeWork(weather: UsableWeather, point: { latitude: number, longitude: number }, zone: string, runs: number, hours: number): PlaceWork {
  const place = { latitudeDeg: point.latitude, longitudeDeg: point.longitude, elevationM: weather.elevationM ?? 0 }
  const stretch = (hourly: HourlyWeather, localHour: Uint8Array, sun?: SunHour[]): Stretch => ({ weather: hourly, etoMm: hourlyReferenceEt(hourly, place, sun), localHour })
  const runHours = Math.min(...weather.runs.map(run => run.hours))
  const startsAt = weather.runs[0]!.startsAt
  const ahead = localHours(startsAt, runHours + SPELL_HOURS, zone)
  const pastHours = localHours(weather.past.startsAt, weather.past.hours, zone).hourOfDay
  const spell = drySpell(ordinaryDryDay(weather.past, pastHours), startsAt + runHours * 3600, ahead.hourOfDay.subarray(runHours))
  const sun = sunOfHours(startsAt, runHours, place)
  const used = weather.runs.slice(0, runs).map(run => firstHours(run, runHours))
  return {
    weather,
    runHours,
    past: stretch(weather.past, pastHours),
    runs: used.map(run => stretch(run, ahead.hourOfDay.subarray(0, runHours), sun)),
    spell: stretch(spell, ahead.hourOfDay.subarray(runHours)),
    ahead,
    rainAt: Float64Array.from(used, run => rainOnset(run.rainMm, hours)),
  }
}

function firstHours(weather: HourlyWeather, hours: number): HourlyWeather {
  if (weather.hours === hours) return weather
  const cut = (column: Float64Array) => column.subarray(0, hours)
  return {
    startsAt: weather.startsAt,
    hours,
    rainMm: cut(weather.rainMm),
    temperatureC: cut(weather.temperatureC),
    humidityPct: cut(weather.humidityPct),
    windMs: cut(weather.windMs),
    radiationWm2: cut(weather.radiationWm2),
  }
}
