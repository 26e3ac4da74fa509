/** The twelve classes of the USDA triangle. */
export const TEXTURE_CLASSES = [
  'sand', 'loamy sand', 'sandy loam', 'loam', 'silt loam', 'silt',
  'sandy clay loam', 'clay loam', 'silty clay loam', 'sandy clay', 'silty clay', 'clay',
] as const
export type TextureClass = (typeof TEXTURE_CLASSES)[number]

/**
 * Texture class of a soil by the USDA triangle.
 *
 * Source: Benham, Ahrens & Nettleton (2009), Clarification of Soil Texture Class Boundaries, USDA-NRCS. The
 * tests run in the published order. Silt is what is left, rounded to 1e-6 % so that a subtraction's last bit
 * does not move a soil over an edge.
 *
 * @param sandPct - percent by weight, 0 to 100
 * @param clayPct - percent by weight, 0 to 100
 * @returns one of the twelve classes
 * @throws {RangeError} when a share is NaN, negative, or both exceed 100 % together
 */
export function textureClass(sandPct: number, clayPct: number): TextureClass {
  if (!(sandPct >= 0 && clayPct >= 0 && sandPct + clayPct <= 100)) throw new RangeError(`sand ${sandPct} % and clay ${clayPct} % are not shares of one soil`)
  const silt = Math.round((100 - sandPct - clayPct) * 1e6) / 1e6
  return coarseClass(sandPct, silt, clayPct) ?? mediumClass(sandPct, silt, clayPct) ?? fineClass(sandPct, silt, clayPct)
}

function coarseClass(sand: number, silt: number, clay: number): TextureClass | null {
  if (silt + 1.5 * clay < 15) return 'sand'
  if (silt + 2 * clay < 30) return 'loamy sand'
  if ((clay >= 7 && clay < 20 && sand > 52) || (clay < 7 && silt < 50)) return 'sandy loam'
  return null
}

function mediumClass(sand: number, silt: number, clay: number): TextureClass | null {
  if (clay >= 7 && clay < 27 && silt >= 28 && silt < 50 && sand <= 52) return 'loam'
  if ((silt >= 50 && clay >= 12 && clay < 27) || (silt >= 50 && silt < 80 && clay < 12)) return 'silt loam'
  if (silt >= 80 && clay < 12) return 'silt'
  return null
}

function fineClass(sand: number, silt: number, clay: number): TextureClass {
  if (clay < 35 && silt < 28 && sand > 45) return 'sandy clay loam'
  if (clay < 40 && sand > 20 && sand <= 45) return 'clay loam'
  if (clay < 40 && sand <= 20) return 'silty clay loam'
  if (sand > 45) return 'sandy clay'
  return silt >= 40 ? 'silty clay' : 'clay'
}
