import { listFarms } from '../../db/queries/farms'
import { createOpenMeteo } from '../../gateways/weather/open-meteo'
import type { WeatherGateway } from '../../gateways/weather/weather-gateway'
import { announceChange } from '../changes'
import { registerJob, type Job } from '../jobs'
import { pullWeather } from './pull-weather'

const HOUR_MS = 3_600_000
/** Each hour at this minute: a new cycle is out by then. */
const MINUTE = 41
/** Longest that the service may take over an answer. */
const PATIENCE_MS = 10_000
let gateway: WeatherGateway | null = null

/** Pulls every hour; after a stop, once. */
export const weatherPullJob: Job = {
  name: 'weather:pull',
  dueAt(app, lastSuccessAt) {
    if (!lastSuccessAt) return new Date(0)
    const minute = MINUTE * 60_000
    return new Date(Math.floor((lastSuccessAt.getTime() - minute) / HOUR_MS + 1) * HOUR_MS + minute)
  },
  async run(app, at) {
    const { weather } = app.settings
    // The demo's time is invented, so there is no sense in waiting in real time before another try.
    const sleep = (ms: number) => new Promise<void>(resolve => setTimeout(resolve, app.demoClock ? 0 : ms))
    gateway ??= createOpenMeteo(weather, { now: app.clock.now, random: Math.random, sleep, patienceMs: PATIENCE_MS })
    await pullWeather({ db: app.db, now: at, gateway, model: { forecast: weather.forecastModel, runs: weather.runsModel } })
    for (const farm of listFarms(app.db)) announceChange(farm.id)
  },
}

export function registerWeatherPull(): void {
  registerJob(weatherPullJob)
}
