import type { Say } from '../../../shared/agronomy/plan/reason'
import type { UnitSystem } from '../../../shared/types/ground-order'

const HECTARES_PER_ACRE = 0.40468564224
const QUARTER_HOUR_MS = 900_000

/**
 * How a farm writes times, temperatures, areas and money.
 *
 * @param startsAt - Unix seconds of hour 0
 */
export function sayFor({ zone, units }: { zone: string, units: UnitSystem }, startsAt: number): Say {
  const day = new Intl.DateTimeFormat('en-US', { timeZone: zone, weekday: 'short' })
  const clock = new Intl.DateTimeFormat('en-US', { timeZone: zone, hour: 'numeric', minute: '2-digit', hour12: true })
  const money = new Intl.NumberFormat('en-US', { style: 'currency', currency: 'USD', maximumFractionDigits: 0 })
  const today = day.format(new Date(startsAt * 1000))
  return {
    time(hour) {
      const instant = new Date(Math.round((startsAt + hour * 3600) * 1000 / QUARTER_HOUR_MS) * QUARTER_HOUR_MS)
      const weekday = day.format(instant)
      const time = sayClock(clock, instant)
      return weekday === today && hour < 24 ? time : `${weekday} ${time}`
    },
    temperature: celsius => units === 'us' ? `${Math.round(celsius * 1.8 + 32)}°F` : `${Math.round(celsius)}°C`,
    area: acres => units === 'us' ? `${Math.round(acres)} ac` : `${Math.round(acres * HECTARES_PER_ACRE)} ha`,
    money: usd => money.format(usd),
  }
}

/** '10:30 am', '2 pm', 'noon', 'midnight'. */
function sayClock(clock: Intl.DateTimeFormat, instant: Date): string {
  const parts = new Map(clock.formatToParts(instant).map(({ type, value }) => [type, value]))
  const [hour, minute, half] = [parts.get('hour')!, parts.get('minute')!, parts.get('dayPeriod')!.toLowerCase()]
  if (hour === '12' && minute === '00') return half === 'pm' ? 'noon' : 'midnight'
  return minute === '00' ? `${hour} ${half}` : `${hour}:${minute} ${half}`
}
