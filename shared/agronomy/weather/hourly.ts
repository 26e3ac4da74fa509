/**
 * Hourly weather on intervals. Element i covers [startsAt + i·3600 s, startsAt + (i+1)·3600 s).
 *
 * Rain is the sum and radiation the mean of the interval; temperature, humidity and wind are its mean. All
 * arrays have `hours` elements. A missing value is NaN; whoever uses it says what it does with one.
 */
export interface HourlyWeather {
  /** start of the first hour, Unix seconds, a whole hour */
  startsAt: number
  hours: number
  /** mm in the hour, rain and melted snowfall together */
  rainMm: Float64Array
  /** °C at 2 m */
  temperatureC: Float64Array
  /** 0 to 100 */
  humidityPct: Float64Array
  /** m/s at 10 m */
  windMs: Float64Array
  /** shortwave, W/m² */
  radiationWm2: Float64Array
}
