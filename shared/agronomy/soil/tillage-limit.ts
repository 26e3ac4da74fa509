import type { TextureClass } from './texture'

/** Parameters of the van Genuchten retention curve of a class. */
export interface RetentionCurve {
  /** residual water, m³/m³ */
  residual: number
  /** m³/m³ */
  saturation: number
  /** 1/cm */
  alpha: number
  n: number
}

/**
 * Class means of Carsel & Parrish (1988), Water Resour. Res. 24:755–769, from general knowledge of that table and
 * not read in print: defaults, not check values.
 */
export const CLASS_RETENTION: Record<TextureClass, RetentionCurve> = {
  'sand': { residual: 0.045, saturation: 0.43, alpha: 0.145, n: 2.68 },
  'loamy sand': { residual: 0.057, saturation: 0.41, alpha: 0.124, n: 2.28 },
  'sandy loam': { residual: 0.065, saturation: 0.41, alpha: 0.075, n: 1.89 },
  'loam': { residual: 0.078, saturation: 0.43, alpha: 0.036, n: 1.56 },
  'silt loam': { residual: 0.067, saturation: 0.45, alpha: 0.02, n: 1.41 },
  'silt': { residual: 0.034, saturation: 0.46, alpha: 0.016, n: 1.37 },
  'sandy clay loam': { residual: 0.1, saturation: 0.39, alpha: 0.059, n: 1.48 },
  'clay loam': { residual: 0.095, saturation: 0.41, alpha: 0.019, n: 1.31 },
  'silty clay loam': { residual: 0.089, saturation: 0.43, alpha: 0.01, n: 1.23 },
  'sandy clay': { residual: 0.1, saturation: 0.38, alpha: 0.027, n: 1.23 },
  'silty clay': { residual: 0.07, saturation: 0.36, alpha: 0.005, n: 1.09 },
  'clay': { residual: 0.068, saturation: 0.38, alpha: 0.008, n: 1.09 },
}

/**
 * Water content at which soil breaks up best: the inflection of its retention curve.
 *
 * Source: Dexter & Bird (2001), Soil Tillage Res. 57:203–212, eq. 6.
 *
 * @param curve - residual below saturation, alpha above 0, n above 1
 * @returns m³/m³
 * @throws {RangeError} when the curve is not one
 */
export function bestTillageWater(curve: RetentionCurve): number {
  refuseNoCurve(curve)
  const m = 1 - 1 / curve.n
  return curve.residual + (curve.saturation - curve.residual) * (1 + 1 / m) ** -m
}

/**
 * Wettest water content at which soil may be tilled.
 *
 * Source: Dexter & Bird (2001), eq. 11. For loam and coarser it lies above field capacity, so that it forbids
 * nothing once the ground has drained: an upper bound there, telling only in fine soils.
 *
 * @param curve - residual below saturation, alpha above 0, n above 1
 * @returns m³/m³
 * @throws {RangeError} when the curve is not one
 */
export function wettestTillageWater(curve: RetentionCurve): number {
  const best = bestTillageWater(curve)
  return best + 0.4 * (curve.saturation - best)
}

function refuseNoCurve({ residual, saturation, alpha, n }: RetentionCurve): void {
  if (!(residual >= 0 && saturation > residual && saturation <= 1)) throw new RangeError(`residual ${residual} and saturation ${saturation} bound no curve`)
  if (!(alpha > 0 && n > 1)) throw new RangeError(`alpha ${alpha} and n ${n} shape no curve`)
}
