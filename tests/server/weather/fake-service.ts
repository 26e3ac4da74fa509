import { setupServer } from 'msw/node'
import { handlers } from '../../../mocks/handlers'
import { createOpenMeteo } from '../../../server/gateways/weather/open-meteo'
import { readSettings } from '../../../server/services/settings'

/** The invented service in front of the real gateway, at a time of the test's choosing. */
export function fakeService() {
  const server = setupServer(...handlers)
  let now = new Date('2025-05-06T10:00:00Z')
  let calls = 0
  const slept: number[] = []
  const settings = readSettings({ NUXT_SESSION_PASSWORD: 'x'.repeat(40) }, { fakesLoaded: false, built: false }).weather
  server.events.on('request:start', () => calls++)
  return {
    start: () => server.listen({ onUnhandledRequest: 'error' }),
    stop: () => server.close(),
    at(instant: Date) {
      now = instant
      ;(globalThis as Record<symbol, unknown>)[Symbol.for('sillion.clock')] = () => instant
    },
    gateway: (patienceMs = 10_000) => createOpenMeteo(settings, { now: () => now, random: () => 0.5, sleep: ms => Promise.resolve(void slept.push(ms)), patienceMs }),
    calls: () => calls,
    slept,
    model: { forecast: settings.forecastModel, runs: settings.runsModel },
  }
}
