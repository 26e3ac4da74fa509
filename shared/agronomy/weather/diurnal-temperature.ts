/**
 * Hour by hour temperature from a day's extremes.
 *
 * Source: Parton & Logan 1981, Agric. Meteorol. 23:205–216: a sine by day, an exponential fall by night. Its three
 * constants for air at 150 cm: hours from noon to the warmest moment, rate of the fall at night, hours from sunrise to
 * the coldest moment. Mean absolute error in the source about 1 °C.
 */
const WARMEST_AFTER_NOON_H = 1.86
const NIGHT_FALL = 2.20
const COLDEST_AFTER_SUNRISE_H = -0.17

/** Sun and extremes of a day as the curve uses them. */
export interface DayOfTemperature {
  minC: number
  maxC: number
  /** minimum that the night after this day falls to; the same day's when the next is not known */
  nextMinC: number
  /** clock hours, sunrise before sunset */
  sunrise: number
  sunset: number
}

/**
 * Air temperature at a clock hour from the day's extremes. Deviation: the evening falls towards the minimum of the
 * morning to come, not to that of the morning past.
 *
 * @param hour - clock hour of the same day, 0 to 24
 * @param day - sun and extremes; times in the same clock
 * @returns °C
 * @throws {RangeError} when the extremes are reversed, the sun sets before it rises, or anything is NaN
 */
export function temperatureAtHour(hour: number, day: DayOfTemperature): number {
  const { minC, maxC, nextMinC, sunrise, sunset } = day
  if (!(minC <= maxC) || !Number.isFinite(nextMinC)) throw new RangeError(`The day's minimum (${minC} °C) is above its maximum (${maxC} °C)`)
  if (!(sunrise < sunset) || !(hour >= 0 && hour <= 24)) throw new RangeError(`No hour ${hour} of a day from ${sunrise} to ${sunset}`)
  if (hour > sunset) return nightTemperature(hour - sunset, day, nextMinC)
  if (hour < sunrise + COLDEST_AFTER_SUNRISE_H) return nightTemperature(hour + 24 - sunset, day, minC)
  return dayTemperature(hour, day)
}

function dayTemperature(hour: number, { minC, maxC, sunrise, sunset }: DayOfTemperature): number {
  const length = sunset - sunrise + 2 * (WARMEST_AFTER_NOON_H - COLDEST_AFTER_SUNRISE_H)
  return minC + (maxC - minC) * Math.sin(Math.PI * (hour - sunrise - COLDEST_AFTER_SUNRISE_H) / length)
}

function nightTemperature(sinceSunset: number, day: DayOfTemperature, towardsC: number): number {
  const night = 24 - (day.sunset - day.sunrise) + COLDEST_AFTER_SUNRISE_H
  return towardsC + (dayTemperature(day.sunset, day) - towardsC) * Math.exp(-NIGHT_FALL * sinceSunset / night)
}
