import type { PlaceId } from '../../../shared/types/ids'
import type { ForecastSummary } from '../../../shared/types/ground-order'
import type { Db } from '../../db/client'
import { findForecastAge } from '../../db/queries/forecasts'
import { findNewestPull } from '../../db/queries/weather-pulls'
import { freshness, freshUntil } from './freshness'

const ATTRIBUTION = { text: 'Weather data by Open-Meteo.com', href: 'https://open-meteo.com/', licence: 'CC BY 4.0' }

const WORST = ['none', 'expired', 'late', 'fresh'] as const

/** A farm's forecast as pages show it, and until when that stands if no newer one comes; null: for good. */
export interface FarmForecast { summary: ForecastSummary, until: Date | null }

/** How old a farm's forecast is, where it comes from and what is wrong with it; its oldest place counts. */
export function farmForecast(db: Db, placeIds: PlaceId[], invented: boolean, now: Date): FarmForecast {
  const ages = placeIds.map(id => ({ forecast: findForecastAge(db, id, 'forecast', now), runs: findForecastAge(db, id, 'runs', now) }))
  const oldest = ages.flatMap(age => age.forecast ?? []).sort((a, b) => a.fetchedAt.getTime() - b.fetchedAt.getTime())[0]
  const runs = ages.flatMap(age => age.runs ?? []).sort((a, b) => a.fetchedAt.getTime() - b.fetchedAt.getTime())[0]
  const statuses = ages.map(age => freshness(age.forecast, age.runs, now))
  const turns = ages.flatMap(age => freshUntil(age.forecast, age.runs, now)?.getTime() ?? [])
  const pull = findNewestPull(db)
  return {
    summary: {
      status: WORST.find(status => statuses.includes(status)) ?? 'none',
      issuedAt: runs?.issuedAt?.toISOString() ?? null,
      fetchedAt: oldest?.fetchedAt.toISOString() ?? null,
      runs: runs?.runs ?? null,
      source: oldest?.source ?? null,
      attribution: ATTRIBUTION,
      invented,
      trouble: pull?.outcome === 'failed' ? pull.detail : null,
    },
    until: turns.length > 0 ? new Date(Math.min(...turns)) : null,
  }
}
