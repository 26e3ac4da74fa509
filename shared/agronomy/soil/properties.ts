/** Fine earth of a soil: sand and clay in percent by weight, organic matter in percent by weight. */
export interface SoilTexture {
  sandPct: number
  clayPct: number
  organicMatterPct: number
}

/** Hydraulic properties; water contents are m³ of water per m³ of soil. */
export interface SoilProperties {
  /** at 1500 kPa */
  wiltingPoint: number
  /** at 33 kPa */
  fieldCapacity: number
  saturation: number
  /** mm/h */
  saturatedConductivityMmH: number
  /** slope of log tension against log water content, λ */
  poreIndex: number
  /** exponent of K = Ks (θ/θS)^n, n = 3 + 2/λ */
  conductivityExponent: number
  /** tension at which air enters, kPa, not below 0 */
  airEntryKpa: number
  /** bulk density, Mg/m³ */
  densityMgM3: number
}

/** Density of soil minerals, Mg/m³ (Saxton & Rawls 2006, eq. 6). */
const PARTICLE_DENSITY = 2.65

/**
 * Soil properties from texture and organic matter.
 *
 * Source: Saxton & Rawls (2006), Soil Sci. Soc. Am. J. 70:1569–1578, eqs. 1–6 and 14–18. Sand and clay enter
 * as fractions, organic matter in percent. The coefficient of eq. 2 is 1.283; a copy in circulation has 1.238.
 * Deviation: air entry comes out below 0 for sands and is held at 0.
 *
 * @param texture - sand and clay 0 to 100 % and together at most 100 %; clay at most 60 %, organic matter at most 8 %
 * @returns water contents in m³/m³, conductivity in mm/h
 * @throws {RangeError} when a share is NaN or outside the range of the method, or in the corners where its fit gives
 *   no curve (sands almost without clay and organic matter; 40 % sand with 60 % clay and much organic matter)
 */
export function soilProperties(texture: SoilTexture): SoilProperties {
  refuseOutside(texture)
  const sand = texture.sandPct / 100
  const clay = texture.clayPct / 100
  const organic = texture.organicMatterPct
  const wiltingPoint = waterAt1500(sand, clay, organic)
  const fieldCapacity = waterAt33(sand, clay, organic)
  const drainable = waterFrom0To33(sand, clay, organic)
  const saturation = fieldCapacity + drainable - 0.097 * sand + 0.043 // eq. 5
  if (!(wiltingPoint > 0 && fieldCapacity > wiltingPoint && saturation > fieldCapacity)) throw new RangeError(`the method gives no water curve for sand ${texture.sandPct} %, clay ${texture.clayPct} %, organic matter ${organic} %`)
  const poreIndex = (Math.log(fieldCapacity) - Math.log(wiltingPoint)) / (Math.log(1500) - Math.log(33)) // eqs. 15, 18
  return {
    wiltingPoint,
    fieldCapacity,
    saturation,
    saturatedConductivityMmH: 1930 * (saturation - fieldCapacity) ** (3 - poreIndex), // eq. 16
    poreIndex,
    conductivityExponent: 3 + 2 / poreIndex, // eq. 17
    airEntryKpa: Math.max(0, airEntry(sand, clay, drainable)),
    densityMgM3: PARTICLE_DENSITY * (1 - saturation), // eq. 6
  }
}

function refuseOutside({ sandPct, clayPct, organicMatterPct }: SoilTexture): void {
  if (!(sandPct >= 0 && clayPct >= 0 && sandPct + clayPct <= 100)) throw new RangeError(`sand ${sandPct} % and clay ${clayPct} % are not shares of one soil`)
  if (!(clayPct <= 60)) throw new RangeError(`clay ${clayPct} % is above 60 %, the range of the method`)
  if (!(organicMatterPct >= 0 && organicMatterPct <= 8)) throw new RangeError(`organic matter ${organicMatterPct} % is outside 0 to 8 %, the range of the method`)
}

/** Eq. 1. */
function waterAt1500(sand: number, clay: number, organic: number): number {
  const first = -0.024 * sand + 0.487 * clay + 0.006 * organic + 0.005 * sand * organic - 0.013 * clay * organic + 0.068 * sand * clay + 0.031
  return first + (0.14 * first - 0.02)
}

/** Eq. 2. */
function waterAt33(sand: number, clay: number, organic: number): number {
  const first = -0.251 * sand + 0.195 * clay + 0.011 * organic + 0.006 * sand * organic - 0.027 * clay * organic + 0.452 * sand * clay + 0.299
  return first + (1.283 * first * first - 0.374 * first - 0.015)
}

/** Eq. 3: water held between saturation and 33 kPa. */
function waterFrom0To33(sand: number, clay: number, organic: number): number {
  const first = 0.278 * sand + 0.034 * clay + 0.022 * organic - 0.018 * sand * organic - 0.027 * clay * organic - 0.584 * sand * clay + 0.078
  return first + (0.636 * first - 0.107)
}

/** Eq. 4, kPa. */
function airEntry(sand: number, clay: number, drainable: number): number {
  const first = -21.67 * sand - 27.93 * clay - 81.97 * drainable + 71.12 * sand * drainable + 8.29 * clay * drainable + 14.05 * sand * clay + 27.16
  return first + (0.02 * first * first - 0.113 * first - 0.7)
}

/**
 * Conductivity at a water content.
 *
 * Source: Saxton & Rawls (2006), eq. 17.
 *
 * @param properties - of the soil
 * @param water - m³/m³, 0 to saturation
 * @returns mm/h
 * @throws {RangeError} when the water content is NaN or outside 0 to saturation
 */
export function conductivityMmH(properties: SoilProperties, water: number): number {
  if (!(water >= 0 && water <= properties.saturation)) throw new RangeError(`water content ${water} is outside 0 to ${properties.saturation}`)
  return properties.saturatedConductivityMmH * (water / properties.saturation) ** properties.conductivityExponent
}

/**
 * Water content at which the soil conducts a given rate: the inverse of eq. 17 of Saxton & Rawls (2006).
 *
 * @param properties - of the soil
 * @param rateMmH - mm/h, above 0 and at most the saturated conductivity
 * @returns m³/m³
 * @throws {RangeError} when the rate is NaN or outside its range
 */
export function waterAtConductivity(properties: SoilProperties, rateMmH: number): number {
  const { saturatedConductivityMmH, saturation, conductivityExponent } = properties
  if (!(rateMmH > 0 && rateMmH <= saturatedConductivityMmH)) throw new RangeError(`rate ${rateMmH} mm/h is outside 0 to ${saturatedConductivityMmH} mm/h`)
  return saturation * (rateMmH / saturatedConductivityMmH) ** (1 / conductivityExponent)
}
