import { fallowCurveNumber } from './curve-number'
import { READILY_EVAPORABLE_MM, residueFactor, totalEvaporableMm } from './evaporation'
import { hydrologicGroup, type HydrologicGroup } from './hydrologic-group'
import { soilProperties, waterAtConductivity, type SoilProperties, type SoilTexture } from './properties'
import { SOIL_SETTINGS } from './settings'
import { textureClass, type TextureClass } from './texture'
import { CLASS_RETENTION, wettestTillageWater } from './tillage-limit'

/** How well the ground below 24 in lets water go. */
export type Drainage = 'tiled' | 'somewhat-poor' | 'poor'

/** Thickness of the three layers, mm: seed zone, rest of the topsoil, subsoil to tile. */
export const LAYER_MM = [100, 200, 300] as const

/** A field's soil as the water balance uses it. Plain numbers: a variant is a copy with some of them changed. */
export interface FieldSoil {
  textureClass: TextureClass
  /** 0 to 300 mm */
  properties: SoilProperties
  /** 300 to 600 mm */
  subsoil: SoilProperties
  hydrologicGroup: HydrologicGroup
  /** antecedent condition II */
  curveNumber: number
  /** share of the runoff that leaves the field, 0 to 1 */
  runoffShare: number
  /** water of the top 100 mm at or under which the seed zone is fit, m³/m³ */
  fitWater: number
  /** wettest water of 100 to 300 mm at which the ground above may be tilled, m³/m³ */
  belowFitWater: number
  /** water of the top 100 mm at or under which the ground carries a sprayer, m³/m³ */
  carryWater: number
  cropCoefficient: number
  /** REW, mm */
  readilyEvaporableMm: number
  /** TEW, mm */
  totalEvaporableMm: number
  /** percent of the surface under residue */
  residuePct: number
  /** evaporation kept under the residue, 0.5 to 1 */
  residueFactor: number
  /** 1/h */
  capillaryPerHour: number
  /** most water that leaves below 600 mm, mm/d */
  bottomMmPerDay: number
  meltMmPerDegreeDay: number
  /** mm */
  surfaceStorageMm: number
}

const CLAY = SOIL_SETTINGS.fitShareClay.value
const CLAY_LOAM = SOIL_SETTINGS.fitShareClayLoam.value
const LOAM = SOIL_SETTINGS.fitShareLoam.value

/** Share of field capacity at which the top 100 mm are fit. Sandy loam and coarser have none: see fitLevel. */
const FIT_SHARE: Partial<Record<TextureClass, number>> = {
  'clay': CLAY,
  'silty clay': CLAY,
  'sandy clay': CLAY,
  'clay loam': CLAY_LOAM,
  'silty clay loam': CLAY_LOAM,
  'sandy clay loam': LOAM,
  'loam': LOAM,
  'silt loam': LOAM,
  'silt': LOAM,
}

const BOTTOM_MM_PER_DAY: Record<Drainage, number> = {
  'tiled': SOIL_SETTINGS.tiledMmPerDay.value,
  'somewhat-poor': SOIL_SETTINGS.somewhatPoorMmPerDay.value,
  'poor': SOIL_SETTINGS.poorMmPerDay.value,
}

/**
 * A field's soil with the defaults of its texture.
 *
 * @param texture - of the topsoil, percent by weight
 * @param drainage - tiled ground keeps the hydrologic group of its conductivity; the others count as D
 * @param residuePct - share of the surface under residue, 0 to 100
 * @throws {RangeError} when a number is NaN or outside the range of a method
 */
export function fieldSoil(texture: SoilTexture, drainage: Drainage, residuePct: number): FieldSoil {
  const properties = soilProperties(texture)
  const subsoil = soilProperties({ ...texture, organicMatterPct: Math.min(texture.organicMatterPct, SOIL_SETTINGS.subsoilOrganicMatterPct.value) })
  const named = textureClass(texture.sandPct, texture.clayPct)
  const group = hydrologicGroup(Math.min(properties.saturatedConductivityMmH, subsoil.saturatedConductivityMmH), drainage !== 'tiled')
  const fitWater = fitLevel(named, properties)
  const totalMm = totalEvaporableMm(properties.fieldCapacity, properties.wiltingPoint, LAYER_MM[0] / 1000)
  return {
    textureClass: named,
    properties,
    subsoil,
    hydrologicGroup: group,
    curveNumber: fallowCurveNumber(group, residuePct),
    runoffShare: SOIL_SETTINGS.runoffShare.value,
    fitWater,
    belowFitWater: belowFitLevel(named, properties),
    carryWater: Math.max(fitWater, SOIL_SETTINGS.carryShare.value * properties.fieldCapacity),
    cropCoefficient: SOIL_SETTINGS.cropCoefficient.value,
    readilyEvaporableMm: Math.min(READILY_EVAPORABLE_MM[named], totalMm),
    totalEvaporableMm: totalMm,
    residuePct,
    residueFactor: residueFactor(residuePct),
    capillaryPerHour: SOIL_SETTINGS.capillaryPerHour.value,
    bottomMmPerDay: BOTTOM_MM_PER_DAY[drainage],
    meltMmPerDegreeDay: SOIL_SETTINGS.meltMmPerDegreeDay.value,
    surfaceStorageMm: SOIL_SETTINGS.surfaceStorageMm.value,
  }
}

/** Sandy loam and coarser never reach field capacity by gravity; they are fit once they drain slowly. */
function fitLevel(named: TextureClass, properties: SoilProperties): number {
  const share = FIT_SHARE[named]
  if (share !== undefined) return share * properties.fieldCapacity
  return waterAtConductivity(properties, SOIL_SETTINGS.practicalDrainageMmPerDay.value / 24)
}

/** Taken over as a degree of saturation, since the class curve and this soil differ in pore space. */
function belowFitLevel(named: TextureClass, properties: SoilProperties): number {
  const curve = CLASS_RETENTION[named]
  return properties.saturation * wettestTillageWater(curve) / curve.saturation
}
