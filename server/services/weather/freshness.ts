import type { ForecastSummary } from '../../../shared/types/ground-order'

const HOUR_MS = 3_600_000
/** Pulled every hour; late after the second that brought nothing; past a day no advice is worked out from it. */
export const LATE_AFTER_MS = 2 * HOUR_MS
export const EXPIRED_AFTER_MS = 24 * HOUR_MS

export function freshness(fetchedAt: Date | null, now: Date): ForecastSummary['status'] {
  if (!fetchedAt) return 'none'
  const age = now.getTime() - fetchedAt.getTime()
  if (age > EXPIRED_AFTER_MS) return 'expired'
  return age > LATE_AFTER_MS ? 'late' : 'fresh'
}
