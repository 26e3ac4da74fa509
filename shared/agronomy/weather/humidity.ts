/**
 * Water vapour in the air and the constants that go with it.
 *
 * Source: Allen, Pereira, Raes & Smith 1998, FAO Irrigation and Drainage Paper 56 (FAO-56), chapter 3.
 */

/**
 * Air pressure from height above sea level. FAO-56 eq 7.
 * @param elevationM - −500 to 9,000 m
 * @returns kPa
 * @throws {RangeError} when the height is outside that range or NaN
 */
export function airPressureKpa(elevationM: number): number {
  if (!(elevationM >= -500 && elevationM <= 9000)) throw new RangeError(`No elevation: ${elevationM} m`)
  return 101.3 * ((293 - 0.0065 * elevationM) / 293) ** 5.26
}

/** Psychrometric constant. FAO-56 eq 8. @param pressureKpa - kPa @returns kPa/°C */
export function psychrometricConstant(pressureKpa: number): number {
  return 0.665e-3 * pressureKpa
}

/** Saturation vapour pressure. FAO-56 eq 11. @param temperatureC - °C @returns kPa */
export function saturationVapourPressure(temperatureC: number): number {
  return 0.6108 * Math.exp(17.27 * temperatureC / (temperatureC + 237.3))
}

/** Mean saturation vapour pressure of a day: of the extremes, never of their mean. FAO-56 eq 12. @returns kPa */
export function dailySaturationVapourPressure(minC: number, maxC: number): number {
  return (saturationVapourPressure(maxC) + saturationVapourPressure(minC)) / 2
}

/** Slope of the saturation vapour pressure curve. FAO-56 eq 13. @returns kPa/°C */
export function vapourPressureSlope(temperatureC: number): number {
  return 4098 * saturationVapourPressure(temperatureC) / (temperatureC + 237.3) ** 2
}

/**
 * Vapour pressure from a psychrometer. FAO-56 eqs 15 and 16.
 * @param dryC - dry bulb, °C
 * @param wetC - wet bulb, °C, not above the dry one
 * @param pressureKpa - kPa
 * @param coefficient - per °C: 0.000662 ventilated, 0.000800 natural, 0.001200 indoor
 * @returns kPa
 * @throws {RangeError} when the wet bulb is above the dry one or either is NaN
 */
export function vapourPressureFromWetBulb(dryC: number, wetC: number, pressureKpa: number, coefficient: number): number {
  if (!(wetC <= dryC)) throw new RangeError(`The wet bulb (${wetC} °C) is above the dry bulb (${dryC} °C)`)
  return saturationVapourPressure(wetC) - coefficient * pressureKpa * (dryC - wetC)
}

/** Vapour pressure from the extremes of temperature and humidity, paired crosswise. FAO-56 eq 17. @returns kPa */
export function vapourPressureFromExtremes(minC: number, maxC: number, minPct: number, maxPct: number): number {
  return (saturationVapourPressure(minC) * maxPct / 100 + saturationVapourPressure(maxC) * minPct / 100) / 2
}

/** The same where the lowest humidity is unreliable. FAO-56 eq 18. @returns kPa */
export function vapourPressureFromHighestHumidity(minC: number, maxPct: number): number {
  return saturationVapourPressure(minC) * maxPct / 100
}

/** The same from the mean humidity, least good. FAO-56 eq 19. @returns kPa */
export function vapourPressureFromMeanHumidity(minC: number, maxC: number, meanPct: number): number {
  return meanPct / 100 * dailySaturationVapourPressure(minC, maxC)
}
