import type { HourlyWeather } from '../weather/hourly'

/**
 * Wind at 10 m above which no spraying is planned, m/s: 10 mph, the highest of the labels read that name one for the
 * boom, held against the wind at 10 m, which is stronger there.
 */
export const MOST_SPRAY_WIND_MS = 4.4704
/**
 * Wind at 10 m under which no spraying is planned, m/s: 5.79 mph, which is 3 mph at a boom 24 in over short growth by
 * the neutral log law (roughness 0.03 m). Under 3 mph at the boom the air may lie still or upside down.
 */
export const LEAST_SPRAY_WIND_MS = 2.588
/** Whole hours after sunrise and before sunset without spraying: the 2019 dicamba labels, the strictest read. */
const AFTER_SUNRISE_HOURS = 1
const BEFORE_SUNSET_HOURS = 2

/**
 * Closes the hours in which the plan leaves the sprayer at home: too much wind or too little, night, and the hours
 * around it. A stand-in that only keeps the plan from counting on impossible hours: the label of the product in the
 * tank, and wind and inversion judged at the field, decide.
 *
 * @param flags - 1 where the ground carries the sprayer; cleared where the hour is closed
 * @param weather - wind at 10 m and radiation of the same hours
 */
export function closeSprayHours(flags: Uint8Array, weather: HourlyWeather): void {
  for (let hour = 0; hour < weather.hours; hour++) {
    const wind = weather.windMs[hour]!
    if (wind < LEAST_SPRAY_WIND_MS || wind > MOST_SPRAY_WIND_MS || !isWellWithinDay(weather, hour)) flags[hour] = 0
  }
}

/** Beyond the ends of the weather the sun counts as up: the hour itself is then what is known. */
function isWellWithinDay({ radiationWm2, hours }: HourlyWeather, hour: number): boolean {
  const until = Math.min(hours - 1, hour + BEFORE_SUNSET_HOURS)
  for (let i = Math.max(0, hour - AFTER_SUNRISE_HOURS); i <= until; i++) if (!(radiationWm2[i]! > 0)) return false
  return true
}
