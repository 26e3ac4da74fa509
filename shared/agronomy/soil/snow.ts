import { SOIL_SETTINGS } from './settings'

const SNOW_AT_OR_BELOW_C = SOIL_SETTINGS.snowAtOrBelowC.value

/**
 * Whether what falls in an hour is snow.
 *
 * Source: the SWAT model's split at the daily mean temperature (1.0 °C in its Ames reference set). Deviation: held
 * against the temperature of the hour.
 *
 * @param temperatureC - air temperature of the hour, °C
 */
export function fallsAsSnow(temperatureC: number): boolean {
  return temperatureC <= SNOW_AT_OR_BELOW_C
}

/**
 * Snow that could melt in some hours, by degree days above 0 °C.
 *
 * Source: NEH-630 ch. 11, M = CM (Ta − Tb) with Tb = 0 °C.
 *
 * @param temperatureC - mean air temperature, °C
 * @param mmPerDegreeDay - CM, mm/°C/d: 2.74 by default in the source, 3.51 on open fields (Kuusisto 1980)
 * @param hours - h
 * @returns mm of water, not negative; the pack may hold less
 */
export function meltableMm(temperatureC: number, mmPerDegreeDay: number, hours: number): number {
  return temperatureC > 0 ? mmPerDegreeDay * temperatureC * hours / 24 : 0
}
