/**
 * Sunshine on the ground, from date, place and what is measured.
 *
 * Source: FAO-56, chapter 3, equations 20 to 50. Angles in degrees at the edge, radians inside; energy in MJ m⁻².
 */

/** Solar constant, MJ m⁻² min⁻¹ (FAO-56 eq 21). */
const SOLAR_CONSTANT = 0.0820
/** Stefan–Boltzmann, MJ K⁻⁴ m⁻² d⁻¹ (FAO-56 eq 39) and per hour (eq 39 as used with eq 53). */
const STEFAN_BOLTZMANN_DAY = 4.903e-9
const STEFAN_BOLTZMANN_HOUR = 2.043e-10
/** Kelvin offset as FAO-56 eq 39 prints it. */
const KELVIN = 273.16
/** Albedo of the reference grass (FAO-56 eq 38). */
const ALBEDO = 0.23

const radians = (degrees: number) => degrees * Math.PI / 180

/** Inverse relative distance to the sun. FAO-56 eq 23. @param dayOfYear - 1 to 366 */
export function inverseSunDistance(dayOfYear: number): number {
  return 1 + 0.033 * Math.cos(2 * Math.PI * dayOfYear / 365)
}

/** Solar declination, radians. FAO-56 eq 24. @param dayOfYear - 1 to 366 */
export function declination(dayOfYear: number): number {
  return 0.409 * Math.sin(2 * Math.PI * dayOfYear / 365 - 1.39)
}

/** Sunset hour angle, radians; 0 in polar night, π in polar day. FAO-56 eq 25. */
export function sunsetHourAngle(latitudeDeg: number, dayOfYear: number): number {
  const cosine = -Math.tan(radians(latitudeDeg)) * Math.tan(declination(dayOfYear))
  return Math.acos(Math.min(1, Math.max(-1, cosine)))
}

/** Daylight hours. FAO-56 eq 34. */
export function daylightHours(latitudeDeg: number, dayOfYear: number): number {
  return 24 / Math.PI * sunsetHourAngle(latitudeDeg, dayOfYear)
}

/** Extraterrestrial radiation of a day, MJ m⁻² d⁻¹. FAO-56 eq 21. @throws {RangeError} for a latitude that isn't one */
export function extraterrestrialDay(latitudeDeg: number, dayOfYear: number): number {
  if (!(Math.abs(latitudeDeg) <= 90)) throw new RangeError(`No latitude: ${latitudeDeg}`)
  const phi = radians(latitudeDeg)
  const delta = declination(dayOfYear)
  const sunset = sunsetHourAngle(latitudeDeg, dayOfYear)
  return 24 * 60 / Math.PI * SOLAR_CONSTANT * inverseSunDistance(dayOfYear)
    * (sunset * Math.sin(phi) * Math.sin(delta) + Math.cos(phi) * Math.cos(delta) * Math.sin(sunset))
}

/** Seasonal correction of solar time, hours. FAO-56 eqs 32 and 33. */
export function seasonalCorrection(dayOfYear: number): number {
  const b = 2 * Math.PI * (dayOfYear - 81) / 364
  return 0.1645 * Math.sin(2 * b) - 0.1255 * Math.cos(b) - 0.025 * Math.sin(b)
}

/**
 * Hour angle of the sun at the middle of a period, radians, 0 at solar noon. FAO-56 eq 31.
 * @param clockHour - standard clock time at the middle of the period, 0 to 24
 * @param zoneWestDeg - longitude of the centre of the time zone, degrees west (UTC: 0)
 * @param longitudeWestDeg - longitude of the place, degrees west
 */
export function hourAngle(clockHour: number, zoneWestDeg: number, longitudeWestDeg: number, dayOfYear: number): number {
  return Math.PI / 12 * (clockHour + 0.06667 * (zoneWestDeg - longitudeWestDeg) + seasonalCorrection(dayOfYear) - 12)
}

/** Extraterrestrial radiation of the hour around a mid-hour angle, MJ m⁻² h⁻¹, 0 at night. FAO-56 eqs 28 to 30. */
export function extraterrestrialHour(latitudeDeg: number, dayOfYear: number, midAngle: number): number {
  const phi = radians(latitudeDeg)
  const delta = declination(dayOfYear)
  const sunset = sunsetHourAngle(latitudeDeg, dayOfYear)
  // An hour that the sun rises or sets in counts for its light part only.
  const from = Math.min(sunset, Math.max(-sunset, midAngle - Math.PI / 24))
  const to = Math.min(sunset, Math.max(-sunset, midAngle + Math.PI / 24))
  const sum = (to - from) * Math.sin(phi) * Math.sin(delta) + Math.cos(phi) * Math.cos(delta) * (Math.sin(to) - Math.sin(from))
  return Math.max(0, 12 * 60 / Math.PI * SOLAR_CONSTANT * inverseSunDistance(dayOfYear) * sum)
}

/** Solar radiation from sunshine. FAO-56 eq 35 with its default coefficients. @returns MJ m⁻² d⁻¹ */
export function radiationFromSunshine(sunshineHours: number, possibleHours: number, extraterrestrial: number): number {
  return (0.25 + 0.5 * sunshineHours / possibleHours) * extraterrestrial
}

/**
 * Solar radiation from the daily range of temperature, where nothing better is known. FAO-56 eq 50.
 * @param coefficient - kRs, °C^−0.5: 0.16 inland, 0.19 at the coast
 * @returns MJ m⁻² d⁻¹, at most the clear-sky radiation
 */
export function radiationFromTemperatures(minC: number, maxC: number, extraterrestrial: number, coefficient: number, clearSky: number): number {
  return Math.min(clearSky, coefficient * Math.sqrt(maxC - minC) * extraterrestrial)
}

/** Clear-sky radiation, in the unit of its input. FAO-56 eq 37. */
export function clearSkyRadiation(extraterrestrial: number, elevationM: number): number {
  return (0.75 + 2e-5 * elevationM) * extraterrestrial
}

/** Net shortwave of the reference grass, in the unit of its input. FAO-56 eq 38. */
export function netShortwave(radiation: number): number {
  return (1 - ALBEDO) * radiation
}

/** Net longwave of a day, MJ m⁻² d⁻¹. FAO-56 eq 39. @param clearness - Rs/Rso, capped at 1 */
export function netLongwaveDay(minC: number, maxC: number, vapourKpa: number, clearness: number): number {
  const mean = ((maxC + KELVIN) ** 4 + (minC + KELVIN) ** 4) / 2
  return STEFAN_BOLTZMANN_DAY * mean * skyFactor(vapourKpa, clearness)
}

/** Net longwave of an hour, MJ m⁻² h⁻¹. FAO-56 eq 39 with the hourly constant. */
export function netLongwaveHour(temperatureC: number, vapourKpa: number, clearness: number): number {
  return STEFAN_BOLTZMANN_HOUR * (temperatureC + KELVIN) ** 4 * skyFactor(vapourKpa, clearness)
}

function skyFactor(vapourKpa: number, clearness: number): number {
  return (0.34 - 0.14 * Math.sqrt(vapourKpa)) * (1.35 * Math.min(1, clearness) - 0.35)
}
