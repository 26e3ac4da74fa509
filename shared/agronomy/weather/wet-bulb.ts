import { airPressureKpa, saturationVapourPressure, vapourPressureFromWetBulb } from './humidity'

/** Coefficient of a ventilated psychrometer, per °C (FAO-56 eq 16). */
const VENTILATED = 0.000662
const STEPS = 60

function known(temperatureC: number, humidityPct: number, [least, most]: readonly [number, number], [driest, dampest]: readonly [number, number]): void {
  if (!(temperatureC >= least && temperatureC <= most)) throw new RangeError(`The temperature (${temperatureC} °C) must be ${least} to ${most} °C`)
  if (!(humidityPct >= driest && humidityPct <= dampest)) throw new RangeError(`The humidity (${humidityPct} %) must be ${driest} to ${dampest} %`)
}

/**
 * Wet bulb at sea level. Stull 2011, J. Appl. Meteor. Climatol. 50:2267, eq 1.
 *
 * Error −1.0 to +0.65 °C, mean under 0.3 °C.
 *
 * @param temperatureC - −20 to 50 °C
 * @param humidityPct - 5 to 99 %
 * @returns °C
 * @throws {RangeError} outside the ranges of the fit
 */
export function wetBulbStull(temperatureC: number, humidityPct: number): number {
  known(temperatureC, humidityPct, [-20, 50], [5, 99])
  const t = temperatureC
  const rh = humidityPct
  return t * Math.atan(0.151977 * Math.sqrt(rh + 8.313659)) + Math.atan(t + rh) - Math.atan(rh - 1.676331) + 0.00391838 * rh ** 1.5 * Math.atan(0.023101 * rh) - 4.686035
}

/**
 * Wet bulb of a ventilated psychrometer at an air pressure: the root of FAO-56 eq 15 with eqs 11 and 16.
 *
 * @param temperatureC - −40 to 60 °C
 * @param humidityPct - above 0, at most 100 %
 * @param pressureKpa - 50 to 110 kPa
 * @returns °C, never above the air
 * @throws {RangeError} outside these ranges
 */
export function wetBulb(temperatureC: number, humidityPct: number, pressureKpa: number): number {
  known(temperatureC, humidityPct, [-40, 60], [0.1, 100])
  if (!(pressureKpa >= 50 && pressureKpa <= 110)) throw new RangeError(`The air pressure (${pressureKpa} kPa) must be 50 to 110 kPa`)
  const vapour = saturationVapourPressure(temperatureC) * humidityPct / 100
  let [low, high] = [dewPoint(temperatureC, humidityPct), temperatureC]
  for (let step = 0; step < STEPS; step++) {
    const middle = Math.min(temperatureC, (low + high) / 2)
    if (vapourPressureFromWetBulb(temperatureC, middle, pressureKpa, VENTILATED) > vapour) high = middle
    else low = middle
  }
  return (low + high) / 2
}

/**
 * Dew point: FAO-56 eq 11 solved for the temperature.
 * @param humidityPct - above 0, at most 100 %
 * @returns °C
 * @throws {RangeError} outside −40 to 60 °C or the range of the humidity
 */
export function dewPoint(temperatureC: number, humidityPct: number): number {
  known(temperatureC, humidityPct, [-40, 60], [0.1, 100])
  const ratio = Math.log(saturationVapourPressure(temperatureC) * humidityPct / 100 / 0.6108)
  return 237.3 * ratio / (17.27 - ratio)
}

/**
 * Delta T: dry bulb less wet bulb, at the pressure of the place. Advice from Australia; no US label read has it.
 * @param elevationM - metres above sea level
 * @returns °C, ≥ 0
 * @throws {RangeError} outside the ranges of the wet bulb or the pressure
 */
export function deltaT(temperatureC: number, humidityPct: number, elevationM: number): number {
  return temperatureC - wetBulb(temperatureC, humidityPct, airPressureKpa(elevationM))
}
