import { OpenMeteoAnswer, OpenMeteoMeta, type OpenMeteoPlace } from '../../../shared/schemas/open-meteo'
import type { Settings } from '../../services/settings'
import { Breaker } from './breaker'
import { fetchJson, type Caller } from './fetch-json'
import { FORECAST_VARIABLES, RUN_VARIABLES, type AskedPlace, type Outcome, type PlaceAnswer, type WeatherGateway, type WeatherVariable } from './weather-gateway'

/** Open-Meteo's names, and how its label stands to the hour: the hour that ends at the label, or the instant of it. */
const NAMES: Record<WeatherVariable, { name: string, label: 'hour before' | 'instant' | 'direction' }> = {
  rainMm: { name: 'precipitation', label: 'hour before' },
  temperatureC: { name: 'temperature_2m', label: 'instant' },
  humidityPct: { name: 'relative_humidity_2m', label: 'instant' },
  windMs: { name: 'wind_speed_10m', label: 'instant' },
  radiationWm2: { name: 'shortwave_radiation', label: 'hour before' },
  windDirectionDeg: { name: 'wind_direction_10m', label: 'direction' },
  gustMs: { name: 'wind_gusts_10m', label: 'hour before' },
}
const AHEAD_DAYS = 7
/** Places in one call: a call's answer must stay well under the size that is refused. */
const PLACES_PER_CALL = { forecast: 50, runs: 4 }
/** An answer whose hours begin further from now than this was made for another time. */
const MOST_HOURS_OFF = 100 * 24
const LEAST_HOURS_AHEAD = 72

export function createOpenMeteo(settings: Settings['weather'], caller: Caller): WeatherGateway {
  const breaker = new Breaker(caller.now)
  const get = (url: string) => breaker.call(() => fetchJson(settings.apiKey ? `${url}&apikey=${encodeURIComponent(settings.apiKey)}` : url, caller))

  async function ask(base: string, places: AskedPlace[], variables: readonly WeatherVariable[], extra: string, chunk: number): Promise<Outcome<PlaceAnswer[]>> {
    const answers: PlaceAnswer[] = []
    for (let from = 0; from < places.length; from += chunk) {
      const some = places.slice(from, from + chunk)
      const outcome = await get(`${base}?${query(some, variables)}${extra}`)
      if (!outcome.ok) return outcome
      const read = readAnswer(outcome.value, some, variables, caller.now())
      if (!read.ok) return read
      answers.push(...read.value)
    }
    return { ok: true, value: answers }
  }

  return {
    source: 'Open-Meteo',
    async issuedAt(kind) {
      const [host, model] = kind === 'forecast' ? [settings.forecastUrl, settings.forecastModel] : [settings.runsUrl, settings.runsModel]
      const outcome = await get(`${host}/data/${model}/static/meta.json?`)
      const meta = outcome.ok ? OpenMeteoMeta.safeParse(outcome.value) : null
      return meta?.success ? new Date(meta.data.last_run_availability_time * 1000) : null
    },
    forecast: (places, pastDays) => ask(`${settings.forecastUrl}/v1/forecast`, places, FORECAST_VARIABLES, `&past_days=${pastDays}&models=${settings.forecastModel}`, PLACES_PER_CALL.forecast),
    runs: places => ask(`${settings.runsUrl}/v1/ensemble`, places, RUN_VARIABLES, `&models=${settings.runsModel}`, PLACES_PER_CALL.runs),
  }
}

function query(places: AskedPlace[], variables: readonly WeatherVariable[]): string {
  return new URLSearchParams({
    latitude: places.map(place => place.latitude).join(','),
    longitude: places.map(place => place.longitude).join(','),
    hourly: variables.map(variable => NAMES[variable].name).join(','),
    forecast_days: String(AHEAD_DAYS), timezone: 'GMT', timeformat: 'unixtime', temperature_unit: 'celsius', wind_speed_unit: 'ms', precipitation_unit: 'mm',
  }).toString()
}

/** The answer as intervals under our own names; refused whole when anything in it can't be right. */
function readAnswer(value: unknown, places: AskedPlace[], variables: readonly WeatherVariable[], now: Date): Outcome<PlaceAnswer[]> {
  const parsed = OpenMeteoAnswer.safeParse(value)
  if (!parsed.success) return { ok: false, trouble: `The weather service sent something that can't be right (${firstIssue(parsed.error)}).` }
  if (parsed.data.length !== places.length) return { ok: false, trouble: 'The weather service answered for other places than we asked for.' }
  const answers = parsed.data.map((answer, index) => placeAnswer(places[index]!, answer, variables))
  const wrong = answers.find(answer => !suits(answer, now))
  return wrong ? { ok: false, trouble: 'The weather service sent a forecast of another time.' } : { ok: true, value: answers }
}

function firstIssue(error: { issues: { message: string, path?: PropertyKey[] }[] }): string {
  const issue = error.issues[0]!
  return issue.path?.length ? `${issue.path.join('.')}: ${issue.message}` : issue.message
}

function suits(answer: PlaceAnswer, now: Date): boolean {
  const seconds = now.getTime() / 1000
  const ahead = (answer.startsAt - seconds) / 3600 + answer.hours
  return Math.abs(answer.startsAt - seconds) / 3600 < MOST_HOURS_OFF && answer.startsAt <= seconds && ahead >= LEAST_HOURS_AHEAD && ahead < MOST_HOURS_OFF
}

function placeAnswer(place: AskedPlace, answer: OpenMeteoPlace, variables: readonly WeatherVariable[]): PlaceAnswer {
  const { time, ...columns } = answer.hourly
  const named = new Map(Object.entries(columns).map(([key, values]) => [withoutModel(key), values]))
  const members = new Set(Object.keys(columns).map(key => /_member\d{2}/.exec(key)?.[0] ?? ''))
  const runs = [...members].sort().map(member => Object.fromEntries(variables.map((variable) => {
    const { name, label } = NAMES[variable]
    return [variable, onIntervals(named.get(name + member) ?? time.map(() => null), label)]
  })))
  return { placeId: place.id, elevationM: answer.elevation ?? null, startsAt: time[0]!, ...wholeHours(runs, time.length - 1) }
}

/** With several models the service appends the model's name: precipitation_member01_ncep_gefs025. */
function withoutModel(key: string): string {
  const name = Object.values(NAMES).find(known => key.startsWith(known.name))?.name ?? key
  return name + (/_member\d{2}/.exec(key)?.[0] ?? '')
}

/** From labels to the hours between them. */
function onIntervals(labels: (number | null)[], label: 'hour before' | 'instant' | 'direction'): Float64Array {
  return Float64Array.from({ length: labels.length - 1 }, (_, i) => {
    const [here, next] = [labels[i] ?? Number.NaN, labels[i + 1] ?? Number.NaN]
    if (label === 'hour before') return next
    return label === 'instant' ? (here + next) / 2 : middleDirection(here, next)
  })
}

function middleDirection(a: number, b: number): number {
  const turn = ((b - a + 540) % 360) - 180
  return (a + turn / 2 + 360) % 360
}

/** Cuts the hours off from which on a value is missing: models differ in how far they reach. */
function wholeHours(runs: PlaceAnswer['runs'], most: number): { hours: number, runs: PlaceAnswer['runs'] } {
  let hours = most
  for (const run of runs) {
    for (const column of Object.values(run)) {
      const gap = column.findIndex(Number.isNaN)
      if (gap >= 0) hours = Math.min(hours, gap)
    }
  }
  return { hours, runs: runs.map(run => Object.fromEntries(Object.entries(run).map(([name, column]) => [name, column.subarray(0, hours)]))) }
}
