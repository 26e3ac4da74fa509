import type { ForecastSummary } from '../../../shared/types/ground-order'

type Status = ForecastSummary['status']
/** When a forecast came to us, and when it was made where the service says so. */
export interface ForecastAge { fetchedAt: Date, issuedAt: Date | null }

const HOUR_MS = 3_600_000
/**
 * Hours after which something is late, and after which no advice is worked out from it. Common practice, no source.
 *
 * The forecast is pulled every hour. Runs come with each cycle of six hours, some hours after it. A service that
 * answers well but is stuck on an old cycle shows by the time of issue.
 */
const LIMITS = {
  forecast: { lateH: 2, expiredH: 24 },
  runs: { lateH: 12, expiredH: 24 },
  issued: { lateH: 18, expiredH: 36 },
}

/** How far a place's weather can be trusted by its age: the worst of forecast and runs, of fetching and issue. */
export function freshness(forecast: ForecastAge | undefined, runs: ForecastAge | undefined, now: Date): Status {
  const clocks = clocksOf(forecast, runs)
  if (!clocks) return 'none'
  const ages = clocks.map(({ since, limits }) => ({ hours: (now.getTime() - since.getTime()) / HOUR_MS, limits }))
  if (ages.some(({ hours, limits }) => hours > limits.expiredH)) return 'expired'
  return ages.some(({ hours, limits }) => hours > limits.lateH) ? 'late' : 'fresh'
}

/** The next instant after which `freshness` says something else; null: none. */
export function freshUntil(forecast: ForecastAge | undefined, runs: ForecastAge | undefined, now: Date): Date | null {
  const turns = (clocksOf(forecast, runs) ?? []).flatMap(({ since, limits }) => [limits.lateH, limits.expiredH].map(hours => since.getTime() + hours * HOUR_MS))
  const next = Math.min(...turns.filter(turn => turn >= now.getTime()))
  return Number.isFinite(next) ? new Date(next) : null
}

function clocksOf(forecast: ForecastAge | undefined, runs: ForecastAge | undefined) {
  if (!forecast || !runs) return null
  return [
    { since: forecast.fetchedAt, limits: LIMITS.forecast },
    { since: runs.fetchedAt, limits: LIMITS.runs },
    ...[forecast, runs].flatMap(({ issuedAt }) => issuedAt ? [{ since: issuedAt, limits: LIMITS.issued }] : []),
  ]
}
