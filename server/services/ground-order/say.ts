import type { Say } from '../../../shared/agronomy/plan/reason'
import type { UnitSystem } from '../../../shared/types/ground-order'
import { sayClock, sayDay, sayShortDayClock } from '../../../shared/utils/local-time'

const HECTARES_PER_ACRE = 0.40468564224
const QUARTER_HOUR_MS = 900_000

/**
 * How a farm writes times, temperatures, areas and money.
 *
 * @param startsAt - Unix seconds of hour 0
 */
export function sayFor({ zone, units }: { zone: string, units: UnitSystem }, startsAt: number): Say {
  const money = new Intl.NumberFormat('en-US', { style: 'currency', currency: 'USD', maximumFractionDigits: 0 })
  const today = sayDay(new Date(startsAt * 1000).toISOString(), zone)
  return {
    time(hour) {
      const instant = new Date(Math.round((startsAt + hour * 3600) * 1000 / QUARTER_HOUR_MS) * QUARTER_HOUR_MS).toISOString()
      return sayDay(instant, zone) === today ? sayClock(instant, zone) : sayShortDayClock(instant, zone)
    },
    temperature: celsius => units === 'us' ? `${Math.round(celsius * 1.8 + 32)}°F` : `${Math.round(celsius)}°C`,
    area: acres => units === 'us' ? `${Math.round(acres)} ac` : `${Math.round(acres * HECTARES_PER_ACRE)} ha`,
    money: usd => money.format(usd),
  }
}
