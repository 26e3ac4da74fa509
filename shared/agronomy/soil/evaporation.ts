import type { TextureClass } from './texture'

/**
 * Water that evaporates from wet ground before drying slows it, mm.
 *
 * Source: FAO-56 Table 19 (p. 144), middle of each row. Clay loam, sandy clay loam and sandy clay have no row and
 * are set between their neighbours.
 */
export const READILY_EVAPORABLE_MM: Record<TextureClass, number> = {
  'sand': 4.5,
  'loamy sand': 6,
  'sandy loam': 8,
  'loam': 9,
  'silt loam': 9.5,
  'silt': 9.5,
  'sandy clay loam': 9,
  'clay loam': 9.5,
  'silty clay loam': 9.5,
  'sandy clay': 9.5,
  'silty clay': 10,
  'clay': 10,
}

/**
 * All the water that can evaporate from the top of the ground.
 *
 * Source: FAO-56 eq. 73.
 *
 * @param fieldCapacity - m³/m³
 * @param wiltingPoint - m³/m³, below field capacity
 * @param depthM - depth that dries by evaporation, m, 0.10 to 0.15
 * @returns TEW, mm
 * @throws {RangeError} when a number is NaN or the range is reversed
 */
export function totalEvaporableMm(fieldCapacity: number, wiltingPoint: number, depthM: number): number {
  if (!(wiltingPoint >= 0 && wiltingPoint < fieldCapacity)) throw new RangeError(`wilting point ${wiltingPoint} is not below field capacity ${fieldCapacity}`)
  if (!(depthM > 0)) throw new RangeError(`depth ${depthM} m is not above 0`)
  return 1000 * (fieldCapacity - 0.5 * wiltingPoint) * depthM
}

/**
 * How much drying of the surface slows evaporation.
 *
 * Source: FAO-56 eq. 74; the depletion is that at the start of the step.
 *
 * @param depletionMm - De, mm under field capacity, not negative
 * @param readilyMm - REW, mm
 * @param totalMm - TEW, mm, above REW
 * @returns Kr, 0 to 1
 */
export function dryingFactor(depletionMm: number, readilyMm: number, totalMm: number): number {
  if (depletionMm <= readilyMm) return 1
  return depletionMm >= totalMm ? 0 : (totalMm - depletionMm) / (totalMm - readilyMm)
}

/**
 * How much residue on the surface slows evaporation: 5 % for each 10 % covered.
 *
 * Source: FAO-56 p. 198, which calls it only approximate.
 *
 * @param residuePct - 0 to 100
 * @returns 0.5 to 1
 * @throws {RangeError} when the share is NaN or outside 0 to 100
 */
export function residueFactor(residuePct: number): number {
  if (!(residuePct >= 0 && residuePct <= 100)) throw new RangeError(`residue ${residuePct} % is outside 0 to 100 %`)
  return 1 - 0.05 * residuePct / 10
}
