import { describe, expect, it } from 'vitest'
import { CROPS } from '../../../../../shared/agronomy/crop/crops'
import { MINIMUM_SOIL_F, MINIMUM_SOIL_MANITOBA_C, minimumSoilC } from '../../../../../shared/agronomy/crop/germination'
import { PLANTING_TABLES } from '../../../../../shared/agronomy/crop/planting-tables'

describe('minimumSoilC', () => {
  // NDSU's °F against Manitoba's own °C: two services, rounded differently and not of one mind about oats and sunflower.
  it.each([
    ['spring wheat', 0.5], ['barley', 1.5], ['oats', 2.3], ['corn', 0.05], ['soybean', 0.05], ['dry bean', 0.05],
    ['field pea', 0.5], ['canola', 0.6], ['sunflower', 1.3], ['flax', 0.2],
  ] as const)('puts %s within %d °C of the Manitoba table', (crop, tolerance) => {
    expect(Math.abs(minimumSoilC(crop) - MINIMUM_SOIL_MANITOBA_C[crop])).toBeLessThanOrEqual(tolerance)
  })

  it('converts a temperature, not a difference', () => {
    expect(minimumSoilC('corn')).toBe(10)
    expect(Object.values(MINIMUM_SOIL_F).every(fahrenheit => fahrenheit > 32)).toBe(true)
  })
})

describe('CROPS', () => {
  it('names a table of the same crop for each kind', () => {
    for (const [kind, crop] of Object.entries(CROPS)) expect(PLANTING_TABLES.get(crop.plantingTable)?.crop).toBe(kind)
  })
})
