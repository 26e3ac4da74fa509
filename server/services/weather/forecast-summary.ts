import type { PlaceId } from '../../../shared/types/ids'
import type { ForecastSummary } from '../../../shared/types/ground-order'
import type { Db } from '../../db/client'
import { findForecastAge } from '../../db/queries/forecasts'
import { findNewestPull } from '../../db/queries/weather-pulls'
import { freshness } from './freshness'

const ATTRIBUTION = { text: 'Weather data by Open-Meteo.com', href: 'https://open-meteo.com/', licence: 'CC BY 4.0' }

/** How old a farm's forecast is, where it comes from and what is wrong with it; its oldest place counts. */
export function forecastSummary(db: Db, placeIds: PlaceId[], invented: boolean, now: Date): ForecastSummary {
  const ages = placeIds.map(id => ({ forecast: findForecastAge(db, id, 'forecast', now), runs: findForecastAge(db, id, 'runs', now) }))
  const complete = ages.length > 0 && ages.every(age => age.forecast && age.runs)
  const oldest = ages.flatMap(age => age.forecast ?? []).sort((a, b) => a.fetchedAt.getTime() - b.fetchedAt.getTime())[0]
  const runs = ages.flatMap(age => age.runs ?? []).sort((a, b) => a.fetchedAt.getTime() - b.fetchedAt.getTime())[0]
  const pull = findNewestPull(db)
  return {
    status: complete ? freshness(oldest!.fetchedAt, now) : 'none',
    issuedAt: runs?.issuedAt?.toISOString() ?? null,
    fetchedAt: oldest?.fetchedAt.toISOString() ?? null,
    runs: runs?.runs ?? null,
    source: oldest?.source ?? null,
    attribution: ATTRIBUTION,
    invented,
    trouble: pull?.outcome === 'failed' ? pull.detail : null,
  }
}
