import type { PlaceId } from '../../../shared/types/ids'

/** Our names for what a forecast holds, in the order in which blocks store them. */
export const FORECAST_VARIABLES = ['rainMm', 'temperatureC', 'humidityPct', 'windMs', 'radiationWm2', 'windDirectionDeg', 'gustMs'] as const
export const RUN_VARIABLES = ['rainMm', 'temperatureC', 'humidityPct', 'windMs', 'radiationWm2'] as const
export type WeatherVariable = (typeof FORECAST_VARIABLES)[number]

export interface AskedPlace { id: PlaceId, latitude: number, longitude: number }

/** Hours of a place as intervals: element i covers [startsAt + i h, + 1 h). One entry in `runs` for a single forecast. */
export interface PlaceAnswer {
  placeId: PlaceId
  elevationM: number | null
  /** Unix seconds */
  startsAt: number
  hours: number
  runs: Partial<Record<WeatherVariable, Float64Array>>[]
}

/** What a call came to: the answer, or a plain sentence on why there is none. */
export type Outcome<Value> = { ok: true, value: Value } | { ok: false, trouble: string }

export interface WeatherGateway {
  source: string
  /** When the newest issue of the model could be had; null when the service doesn't say. */
  issuedAt: (kind: 'forecast' | 'runs') => Promise<Date | null>
  /** @param pastDays - 0 to 92 */
  forecast: (places: AskedPlace[], pastDays: number) => Promise<Outcome<PlaceAnswer[]>>
  runs: (places: AskedPlace[]) => Promise<Outcome<PlaceAnswer[]>>
}
