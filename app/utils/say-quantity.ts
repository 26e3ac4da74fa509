import { inchesFromMm, sayArea, sayDollars, sayRain, sayTemperature } from '#shared/utils/units'
import type { Quantity, UnitSystem } from '#shared/types/ground-order'

/** A quantity in the farm's units; 'not known' where it is not. */
export function sayQuantity(quantity: Quantity, units: UnitSystem, zone: string): string {
  if (quantity.unit === 'text') return quantity.value
  if (quantity.value === null) return 'not known'
  if (quantity.unit === 'instant') return sayDayClock(quantity.value, zone)
  const value = quantity.value
  switch (quantity.unit) {
    case 'usd': return sayDollars(value, Math.abs(value) < 1000 ? 1 : 100)
    case 'usd/h': return `${sayDollars(value, 1)} an hour`
    case 'ac': return sayArea(value, units)
    case 'ac/h': return `${sayArea(value, units)} an hour`
    case 'h': return `${value.toFixed(1)} h`
    case 'd': return `${value.toFixed(1)} days`
    case 'mm': return units === 'us' && inchesFromMm(value) < 0.005 ? '0 in' : sayRain(value, units)
    case 'c': return sayTemperature(value, units)
    case 'm3/m3': return `${(value * 100).toFixed(1)}%`
    case 'share': return sayChance(value)
    case 'count': return String(value)
    case 'bu/ac': return `${value} bu/ac`
    case 'usd/bu': return `$${value.toFixed(2)}/bu`
  }
}
