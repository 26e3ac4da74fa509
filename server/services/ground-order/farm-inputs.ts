import type { HourlyWeather } from '../../../shared/agronomy/weather/hourly'
import type { FarmId, PlaceId } from '../../../shared/types/ids'
import type { ForecastSummary, GroundOrder } from '../../../shared/types/ground-order'
import type { CropRow } from '../../db/queries/crops'
import type { FieldRow } from '../../db/queries/fields'
import type { MachineRow } from '../../db/queries/machines'
import type { PassTotal } from '../../db/queries/pass-records'
import type { SoilRow } from '../../db/queries/soils'

/** What the order needs to know of its farm. */
export interface OrderFarm {
  id: FarmId
  slug: string
  name: string
  zone: string
  units: GroundOrder['farm']['units']
  latitude: number
  longitude: number
  invented: boolean
  revision: number
}

/** Weather of a place that an order can be made from. All of it starts or ends at the current hour. */
export interface UsableWeather {
  past: HourlyWeather
  forecast: HourlyWeather & { gustMs: Float64Array, windDirectionDeg: Float64Array }
  runs: HourlyWeather[]
  issuedAt: Date | null
  fetchedAt: Date
  elevationM: number | null
}

/** Everything that an order is worked out from. */
export interface FarmInputs {
  farm: OrderFarm
  now: Date
  fields: FieldRow[]
  soils: SoilRow[]
  crops: CropRow[]
  machines: MachineRow[]
  passTotals: PassTotal[]
  /** where the farm's places lie */
  places: readonly { id: PlaceId, latitude: number, longitude: number }[]
  /** by place; a sentence where there is no weather to use */
  weather: Map<PlaceId, UsableWeather | { missing: string }>
  forecast: ForecastSummary
}
