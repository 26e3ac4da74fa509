import type { UnitSystem } from '../types/ground-order'

/** From SI to what people read, in one place. Conversion factors are exact by definition. */
const MM_PER_INCH = 25.4
const MS_PER_MPH = 0.44704
const MS_PER_KMH = 1 / 3.6
const HA_PER_AC = 0.404_685_642_24

export const inchesFromMm = (mm: number) => mm / MM_PER_INCH
export const mmFromInches = (inches: number) => inches * MM_PER_INCH
export const fahrenheitFromC = (celsius: number) => celsius * 9 / 5 + 32
export const celsiusFromF = (fahrenheit: number) => (fahrenheit - 32) * 5 / 9
export const mphFromMs = (ms: number) => ms / MS_PER_MPH
export const msFromMph = (mph: number) => mph * MS_PER_MPH
export const kmhFromMs = (ms: number) => ms / MS_PER_KMH
export const hectaresFromAc = (acres: number) => acres * HA_PER_AC

/** '0.72 in', '18 mm'. */
export function sayRain(mm: number, units: UnitSystem): string {
  return units === 'us' ? `${inchesFromMm(mm).toFixed(2)} in` : `${mm.toFixed(mm < 9.95 ? 1 : 0)} mm`
}

/** '49°'; the letter stands once where the unit is not plain. */
export function sayTemperature(celsius: number, units: UnitSystem, withLetter = true): string {
  const value = Math.round(units === 'us' ? fahrenheitFromC(celsius) : celsius)
  return `${value === 0 ? 0 : value}°${withLetter ? (units === 'us' ? 'F' : 'C') : ''}`
}

/** Wind as a whole number, in mph or km/h. */
export function windNumber(ms: number, units: UnitSystem): number {
  return Math.round(units === 'us' ? mphFromMs(ms) : kmhFromMs(ms))
}

/** '236 ac', '95.5 ha'. */
export function sayArea(acres: number, units: UnitSystem): string {
  return units === 'us' ? `${thousands(Math.round(acres))} ac` : `${thousands(Math.round(hectaresFromAc(acres) * 10) / 10)} ha`
}

/** '$21,400', to the nearest 100. */
export function sayDollars(usd: number, step = 100): string {
  const value = Math.round(usd / step) * step
  return `${value < 0 ? '−' : ''}$${thousands(Math.abs(value))}`
}

function thousands(value: number): string {
  const [whole, part] = String(value).split('.')
  return whole!.replace(/\B(?=(\d{3})+$)/g, ',') + (part ? `.${part}` : '')
}
