import type { SoilProperties } from './properties'

/**
 * Water that leaves the foot of a layer under gravity alone in some hours, dθ/dt = −K(θ)/z solved in closed form.
 *
 * Source: K from Saxton & Rawls (2006) eq. 17; the unit-gradient form after Black, Gardner & Thurtell (1969) and
 * Sisson, Ferguson & van Genuchten (1980). Where little flows, the first five terms of the binomial series stand for
 * the power: they leave out less than 1e-8 of the flow.
 *
 * @param properties - of the layer
 * @param depthMm - thickness of the layer, mm
 * @param waterMm - water in the layer, mm, 0 to saturation
 * @param hours - h, not negative
 * @returns mm
 */
export function drainedMm(properties: SoilProperties, depthMm: number, waterMm: number, hours: number): number {
  const full = depthMm * properties.saturation
  const slope = properties.conductivityExponent - 1
  if (waterMm <= 0) return 0
  const speed = slope * properties.saturatedConductivityMmH * hours / full * Math.exp(slope * Math.log(waterMm / full))
  if (speed < SERIES_BELOW) return waterMm * lossBySeries(speed, 1 / slope)
  return waterMm * (1 - Math.exp(-Math.log(1 + speed) / slope))
}

/** Where the series is as good as the power, and quicker. */
const SERIES_BELOW = 0.02

/** 1 − (1 + x)^−a to the fifth term. */
function lossBySeries(x: number, a: number): number {
  return a * x * (1 - (a + 1) / 2 * x * (1 - (a + 2) / 3 * x * (1 - (a + 3) / 4 * x * (1 - (a + 4) / 5 * x))))
}

/**
 * Hours for a layer to drain from one water content to a lower one under gravity alone.
 *
 * @param properties - of the layer
 * @param depthMm - thickness of the layer, mm, above 0
 * @param from - m³/m³, at most saturation
 * @param to - m³/m³, above 0, at most `from`
 * @returns h
 * @throws {RangeError} when a number is NaN or the range is reversed
 */
export function hoursToDrain(properties: SoilProperties, depthMm: number, from: number, to: number): number {
  if (!(depthMm > 0)) throw new RangeError(`depth ${depthMm} mm is not above 0`)
  if (!(to > 0 && to <= from && from <= properties.saturation)) throw new RangeError(`can't drain from ${from} to ${to} with saturation ${properties.saturation}`)
  const { saturation, saturatedConductivityMmH, conductivityExponent } = properties
  const slope = conductivityExponent - 1
  return depthMm * saturation / (saturatedConductivityMmH * slope) * ((saturation / to) ** slope - (saturation / from) ** slope)
}
