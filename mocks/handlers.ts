import { delay, http, HttpResponse } from 'msw'
import { DEMO_START } from '../server/services/clock'
import { troubleInForce, type Trouble } from './trouble'
import { availableAt, column, isVariable, newestCycle, RUNS } from './world/service'
import type { Place } from './world/season'

/** The invented weather service, in the shapes of the real one (Open-Meteo). Its data says that it is invented. */

const HOURS_MS = 3_600_000
const INVENTED = { 'x-invented': 'weather' }

/** The server's own clock, which the demo can move on; without a server, the morning that the demo starts. */
function nowHours(): number {
  const clock = (globalThis as Record<symbol, unknown>)[Symbol.for('sillion.clock')] as (() => Date) | undefined
  return (clock?.() ?? DEMO_START).getTime() / HOURS_MS
}

export const handlers = [
  http.get('https://api.open-meteo.com/v1/forecast', ({ request }) => answer(request, 1)),
  http.get('https://ensemble-api.open-meteo.com/v1/ensemble', ({ request }) => answer(request, RUNS)),
  http.get('https://api.open-meteo.com/data/:model/static/meta.json', meta),
  http.get('https://ensemble-api.open-meteo.com/data/:model/static/meta.json', meta),
]

async function meta() {
  const trouble = troubleInForce()
  if (trouble) return misbehave(trouble, '{}')
  const cycle = newestCycle(nowHours())
  return HttpResponse.json({
    last_run_initialisation_time: Math.round(cycle * 3600),
    last_run_modification_time: Math.round(availableAt(cycle) * 3600),
    last_run_availability_time: Math.round(availableAt(cycle) * 3600),
    temporal_resolution_seconds: 3600,
    update_interval_seconds: 21_600,
  }, { headers: INVENTED })
}

async function answer(request: Request, runs: number) {
  const query = new URL(request.url).searchParams
  const trouble = troubleInForce()
  const refusal = refusalOf(query)
  if (refusal) return HttpResponse.json({ error: true, reason: refusal }, { status: 400 })
  const bodies = placesOf(query).map((place, index) => bodyFor(query, place, index, runs, trouble))
  const text = JSON.stringify(bodies.length === 1 ? bodies[0] : bodies)
  if (trouble) return misbehave(trouble, text)
  return new HttpResponse(text, { headers: { 'content-type': 'application/json', ...INVENTED } })
}

function placesOf(query: URLSearchParams): Place[] {
  const longitudes = (query.get('longitude') ?? '').split(',').map(Number)
  return (query.get('latitude') ?? '').split(',').map((latitude, index) => ({ latitude: Number(latitude), longitude: longitudes[index]! }))
}

function refusalOf(query: URLSearchParams): string | null {
  const unknown = (query.get('hourly') ?? '').split(',').find(name => !isVariable(name))
  if (unknown !== undefined) return `Cannot initialize WeatherVariable from invalid String value ${unknown} for key hourly`
  if (placesOf(query).some(({ latitude }) => !(Math.abs(latitude) <= 90))) return `Latitude must be in range of -90 to 90°. Given: ${query.get('latitude')}.`
  const days = Number(query.get('forecast_days') ?? 7)
  if (!(days >= 0 && days <= 16)) return `Forecast days is invalid. Allowed range 0 to 16. Given ${days}.`
  const past = Number(query.get('past_days') ?? 0)
  if (!(past >= 0 && past <= 92)) return `Past days is invalid. Allowed range 0 to 92. Given ${past}.`
  if (query.get('timeformat') !== 'unixtime' || query.get('wind_speed_unit') !== 'ms') return 'The invented service only knows timeformat=unixtime and wind_speed_unit=ms.'
  return null
}

function bodyFor(query: URLSearchParams, place: Place, index: number, runs: number, trouble: Trouble | null) {
  const now = nowHours()
  const today = Math.floor(now / 24) * 24
  const from = today - 24 * Number(query.get('past_days') ?? 0)
  const hours = 24 * Number(query.get('forecast_days') ?? 7) + (today - from)
  const shift = trouble === 'stale-timestamps' ? -24 * 400 : trouble === 'future-timestamps' ? 24 * 400 : 0
  const hourly: Record<string, number[]> = { time: Array.from({ length: hours }, (_, i) => (from + i + shift) * 3600) }
  const units: Record<string, string> = { time: 'unixtime' }
  for (const name of (query.get('hourly') ?? '').split(',')) {
    if (!isVariable(name)) continue
    for (let run = 0; run < runs; run++) {
      const key = run === 0 ? name : `${name}_member${String(run).padStart(2, '0')}`
      const values = column(name, place, from, hours, now, runs === 1 ? -1 : run)
      hourly[key] = trouble === 'implausible' ? values.map(value => value + 900) : values
      units[key] = unitOf(name, trouble)
    }
  }
  return {
    latitude: place.latitude, longitude: place.longitude, ...(index > 0 ? { location_id: index } : {}),
    generationtime_ms: 0.2, utc_offset_seconds: 0, timezone: 'GMT', timezone_abbreviation: 'GMT', elevation: 274,
    hourly_units: units, hourly,
  }
}

function unitOf(name: string, trouble: Trouble | null): string {
  if (name === 'temperature_2m' || name === 'dew_point_2m') return trouble === 'wrong-units' ? '°F' : '°C'
  if (name === 'precipitation') return trouble === 'wrong-units' ? 'inch' : 'mm'
  if (name.startsWith('wind_direction')) return '°'
  if (name.startsWith('wind')) return 'm/s'
  return name === 'shortwave_radiation' ? 'W/m²' : '%'
}

/** Fails in the way asked for. */
async function misbehave(trouble: Trouble, text: string) {
  const json = { 'content-type': 'application/json' }
  switch (trouble) {
    case 'refused': return HttpResponse.error()
    case 'hang': {
      await delay('infinite')
      return HttpResponse.error()
    }
    case 'drip': return new HttpResponse(drip(text), { headers: json })
    case '500': return new HttpResponse('Internal Server Error', { status: 500 })
    case '503': return HttpResponse.json({ error: true, reason: 'The service is overloaded' }, { status: 503 })
    case '429': return HttpResponse.json({ error: true, reason: 'Minutely API request limit exceeded. Please try again in one minute.' }, { status: 429, headers: { 'retry-after': '60' } })
    case 'html': return new HttpResponse('<!doctype html><title>Maintenance</title>', { headers: { 'content-type': 'text/html' } })
    case 'truncated': return new HttpResponse(`${text.slice(0, text.length / 2)}Unexpected error while streaming data: timeout`, { headers: json })
    case 'empty-array': return new HttpResponse('[]', { headers: json })
    case 'huge': return new HttpResponse(huge(), { headers: json })
    case 'redirect': return new HttpResponse(null, { status: 302, headers: { location: 'https://elsewhere.example/' } })
    default: return new HttpResponse(text, { headers: json })
  }
}

function drip(text: string): ReadableStream<Uint8Array> {
  const bytes = new TextEncoder().encode(text)
  let sent = 0
  return new ReadableStream({
    async pull(controller) {
      await delay(1000)
      controller.enqueue(bytes.subarray(sent, ++sent))
    },
  })
}

function huge(): ReadableStream<Uint8Array> {
  const block = new Uint8Array(1024 * 1024).fill(32)
  let sent = 0
  return new ReadableStream({
    pull(controller) {
      if (++sent > 50) controller.close()
      else controller.enqueue(block)
    },
  })
}
