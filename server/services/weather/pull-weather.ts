import { randomUUID } from 'node:crypto'
import type { ForecastId, PlaceId } from '../../../shared/types/ids'
import type { Db, DbOrTransaction } from '../../db/client'
import { packBlock } from '../../db/forecast-block'
import { findForecastAge, insertForecast } from '../../db/queries/forecasts'
import { findNewestHour, upsertHours } from '../../db/queries/hourly-weather'
import { listPlacesInUse, updateElevation, type PlaceRow } from '../../db/queries/places'
import { insertPull, updatePull } from '../../db/queries/weather-pulls'
import { FORECAST_VARIABLES, RUN_VARIABLES, type Outcome, type PlaceAnswer, type WeatherGateway, type WeatherVariable } from '../../gateways/weather/weather-gateway'
import { keepDays } from './keep-days'

/** Past days that the soil model starts from, and the most that the service gives. */
const FIRST_PAST_DAYS = 61
const MOST_PAST_DAYS = 92
const HOUR_MS = 3_600_000
const DAY_MS = 24 * HOUR_MS
/** Runs are asked for again when a newer cycle is out, or after this long when nobody says. */
const RUNS_AGE_MS = 6 * HOUR_MS

export interface PullDeps { db: Db, now: Date, gateway: WeatherGateway, model: { forecast: string, runs: string } }

/**
 * Pulls every place in use: the forecast with the past hours that are missing, and the runs when there are newer ones.
 *
 * All that a pull brings is stored in one transaction, or nothing is. Each try leaves its row in the pulls.
 *
 * @returns how many places were stored
 * @throws {Error} with a plain sentence when the service gave nothing that can be used
 */
export async function pullWeather(deps: PullDeps): Promise<number> {
  const { db, now } = deps
  const places = listPlacesInUse(db)
  const pull = insertPull(db, now, places.length)
  const got = await ask(deps, places)
  if (!got.ok) {
    updatePull(db, pull, { endedAt: now, outcome: 'failed', stored: 0, detail: got.trouble })
    throw new Error(got.trouble)
  }
  db.transaction((tx) => {
    for (const answer of got.value.forecasts) storeForecast(tx, deps, answer, got.value.forecastIssuedAt)
    for (const answer of got.value.runs) storeBlock(tx, deps, answer, 'runs', RUN_VARIABLES, got.value.runsIssuedAt, firstHourAhead(answer, now))
    updatePull(tx, pull, { endedAt: now, outcome: 'done', stored: places.length, detail: null })
  }, { behavior: 'immediate' })
  return places.length
}

interface Got { forecasts: PlaceAnswer[], runs: PlaceAnswer[], forecastIssuedAt: Date | null, runsIssuedAt: Date | null }

async function ask({ db, now, gateway }: PullDeps, places: PlaceRow[]): Promise<Outcome<Got>> {
  if (places.length === 0) return { ok: true, value: { forecasts: [], runs: [], forecastIssuedAt: null, runsIssuedAt: null } }
  const forecasts: PlaceAnswer[] = []
  for (const [pastDays, some] of byPastDays(db, places, now)) {
    const outcome = await gateway.forecast(some, pastDays)
    if (!outcome.ok) return outcome
    forecasts.push(...outcome.value)
  }
  const runsIssuedAt = await gateway.issuedAt('runs')
  const wanting = places.filter(place => wantsRuns(db, place.id, now, runsIssuedAt))
  const runs = wanting.length > 0 ? await gateway.runs(wanting) : { ok: true as const, value: [] }
  if (!runs.ok) return runs
  return { ok: true, value: { forecasts, runs: runs.value, forecastIssuedAt: await gateway.issuedAt('forecast'), runsIssuedAt } }
}

/** Places by the days that each lacks, so that a place that was kept up needs little. */
function byPastDays(db: Db, places: PlaceRow[], now: Date): Map<number, PlaceRow[]> {
  const groups = new Map<number, PlaceRow[]>()
  for (const place of places) {
    const newest = findNewestHour(db, place.id)
    const days = newest ? Math.min(MOST_PAST_DAYS, Math.ceil((now.getTime() - newest.getTime()) / DAY_MS) + 1) : FIRST_PAST_DAYS
    groups.set(days, [...groups.get(days) ?? [], place])
  }
  return groups
}

function wantsRuns(db: Db, placeId: PlaceId, now: Date, issuedAt: Date | null): boolean {
  const stored = findForecastAge(db, placeId, 'runs', now)
  if (!stored) return true
  if (issuedAt && stored.issuedAt) return issuedAt > stored.issuedAt
  return now.getTime() - stored.fetchedAt.getTime() >= RUNS_AGE_MS
}

function firstHourAhead(answer: PlaceAnswer, now: Date): number {
  return Math.max(0, Math.floor((now.getTime() / 1000 - answer.startsAt) / 3600))
}

function storeForecast(tx: DbOrTransaction, deps: PullDeps, answer: PlaceAnswer, issuedAt: Date | null): void {
  const over = firstHourAhead(answer, deps.now)
  const run = answer.runs[0]! as Record<WeatherVariable, Float64Array>
  upsertHours(tx, Array.from({ length: over }, (_, i) => ({
    placeId: answer.placeId, startsAt: new Date((answer.startsAt + i * 3600) * 1000), source: 'analysis' as const, issuedAt, fetchedAt: deps.now,
    rainMm: run.rainMm[i]!, temperatureC: run.temperatureC[i]!, humidityPct: run.humidityPct[i]!, windMs: run.windMs[i]!,
    windDirectionDeg: run.windDirectionDeg[i]!, gustMs: run.gustMs[i]!, radiationWm2: run.radiationWm2[i]!,
  })))
  storeBlock(tx, deps, answer, 'forecast', FORECAST_VARIABLES, issuedAt, over)
  if (answer.elevationM !== null) updateElevation(tx, answer.placeId, answer.elevationM)
  keepDays(tx, answer, over, issuedAt, deps.now)
}

/** Keeps the hours from `from` on; those before it are over. */
function storeBlock(tx: DbOrTransaction, { now, gateway, model }: PullDeps, answer: PlaceAnswer, kind: 'forecast' | 'runs', variables: readonly WeatherVariable[], issuedAt: Date | null, from: number): void {
  const hours = answer.hours - from
  const runs = answer.runs.map(run => Object.fromEntries(variables.map(variable => [variable, run[variable]!.subarray(from)])))
  insertForecast(tx, {
    id: randomUUID() as string as ForecastId, placeId: answer.placeId, kind, source: gateway.source, model: model[kind], issuedAt, fetchedAt: now,
    startsAt: new Date((answer.startsAt + from * 3600) * 1000), hours, runs: runs.length, variables: [...variables], data: packBlock(variables, runs, hours),
  })
}
