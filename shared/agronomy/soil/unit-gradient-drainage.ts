import type { SoilProperties } from './properties'

/**
 * Water that leaves the foot of a layer under gravity alone in some hours, dθ/dt = −K(θ)/z solved in closed form.
 *
 * Source: K from Saxton & Rawls (2006) eq. 17; the unit-gradient form after Black, Gardner & Thurtell (1969) and
 * Sisson, Ferguson & van Genuchten (1980). Where the outflow is tiny (second-order term under 1e-10 of it) the
 * series is used in its place.
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
  if (speed < 1e-5) return waterMm * speed / slope * (1 - 0.5 * speed * (1 + 1 / slope))
  return -waterMm * Math.expm1(-Math.log1p(speed) / slope)
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
