/**
 * Minimum soil temperature at seed depth for germination.
 *
 * Sources: °F, NDSU county releases and Montana State (Roosevelt County) copies of the same table; °C, Manitoba table
 * in 'Know your minimum germination temperatures'. Where both name a crop they agree within 2.3 °C. Measured at seed
 * depth, morning and evening, averaged over two to three days (Manitoba).
 */
export const MINIMUM_SOIL_F = {
  'spring wheat': 40, 'durum': 40, 'barley': 40, 'canola': 40, 'mustard': 40, 'field pea': 40, 'lentil': 40,
  'oats': 45, 'sunflower': 45, 'chickpea': 45,
  'flax': 48,
  'corn': 50, 'soybean': 50, 'dry bean': 50,
} as const

export const MINIMUM_SOIL_MANITOBA_C = {
  'spring wheat': 4, 'barley': 3, 'oats': 5, 'corn': 10, 'soybean': 10, 'dry bean': 10, 'field pea': 4, 'canola': 5,
  'sunflower': 6, 'flax': 9,
} as const

/**
 * Minimum soil temperature of a crop in °C, from the °F table.
 */
export function minimumSoilC(crop: keyof typeof MINIMUM_SOIL_F): number {
  return (MINIMUM_SOIL_F[crop] - 32) / 1.8
}
