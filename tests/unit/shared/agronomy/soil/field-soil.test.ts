import { describe, expect, it } from 'vitest'
import { fieldSoil } from '../../../../../shared/agronomy/soil/field-soil'

describe('fieldSoil', () => {
  // Defaults by texture: Saxton & Rawls (2006) at the organic matter shown, REW from the middle of FAO-56 Table 19,
  // TEW by its eq. 73, recomputed. Tolerance: half the last digit given.
  it.each([
    ['clay', 25, 50, 3.0, 0.298, 0.420, 0.501, 1.3, 25.3, 10, 27.1, 0.378],
    ['silty clay', 5, 50, 4.5, 0.292, 0.417, 0.558, 6.5, 24.5, 10, 27.1, 0.375],
    ['silty clay loam', 10, 33, 4.0, 0.208, 0.383, 0.543, 10.6, 15.6, 9.5, 27.9, 0.352],
    ['clay loam', 30, 35, 4.0, 0.223, 0.366, 0.502, 6.4, 18.4, 9.5, 25.4, 0.336],
    ['loam', 40, 20, 3.0, 0.140, 0.285, 0.473, 17.4, 13.7, 9, 21.5, 0.271],
    ['silt loam', 20, 15, 3.0, 0.113, 0.311, 0.496, 19.2, 10.5, 9.5, 25.5, 0.295],
    ['sandy loam', 65, 10, 2.0, 0.076, 0.172, 0.437, 47.4, 12.4, 8, 13.4, 0.247],
    ['sand', 88, 5, 1.5, 0.039, 0.088, 0.439, 104, 12.4, 4.5, 6.9, 0.233],
  ])('has the defaults of %s', (name, sandPct, clayPct, organicMatterPct, wilting, capacity, saturation, ks, n, rew, tew, fit) => {
    const soil = fieldSoil({ sandPct, clayPct, organicMatterPct }, 'tiled', 0)
    expect(soil.textureClass).toBe(name)
    expect(Math.abs(soil.properties.wiltingPoint - wilting)).toBeLessThanOrEqual(0.00051)
    expect(Math.abs(soil.properties.fieldCapacity - capacity)).toBeLessThanOrEqual(0.00051)
    expect(Math.abs(soil.properties.saturation - saturation)).toBeLessThanOrEqual(0.00051)
    expect(Math.abs(soil.properties.saturatedConductivityMmH - ks)).toBeLessThanOrEqual(ks > 100 ? 0.51 : 0.051)
    expect(Math.abs(soil.properties.conductivityExponent - n)).toBeLessThanOrEqual(0.051)
    expect(soil.readilyEvaporableMm).toBe(rew)
    expect(Math.abs(soil.totalEvaporableMm - tew)).toBeLessThanOrEqual(0.051)
    expect(Math.abs(soil.fitWater - fit)).toBeLessThanOrEqual(0.00051)
  })

  it('keeps the fit level of clays within the band of the published criteria, 0.84 to 0.99 of field capacity', () => {
    for (const [sandPct, clayPct] of [[25, 50], [5, 50], [10, 45], [50, 40]] as const) {
      const soil = fieldSoil({ sandPct, clayPct, organicMatterPct: 3 }, 'tiled', 0)
      expect(soil.fitWater / soil.properties.fieldCapacity).toBeGreaterThan(0.84)
      expect(soil.fitWater / soil.properties.fieldCapacity).toBeLessThan(0.99)
    }
  })

  it('carries a sprayer at least as wet as it may be tilled', () => {
    for (const [sandPct, clayPct] of [[25, 50], [30, 35], [40, 20], [88, 5]] as const) {
      const soil = fieldSoil({ sandPct, clayPct, organicMatterPct: 2 }, 'tiled', 0)
      expect(soil.carryWater).toBeGreaterThanOrEqual(soil.fitWater)
    }
  })

  it('drains by its drainage, and counts as group D unless tiled', () => {
    const loam = { sandPct: 40, clayPct: 20, organicMatterPct: 3 }
    expect((['tiled', 'somewhat-poor', 'poor'] as const).map(drainage => fieldSoil(loam, drainage, 0).bottomMmPerDay)).toEqual([9.5, 2, 0.5])
    expect((['tiled', 'somewhat-poor', 'poor'] as const).map(drainage => fieldSoil(loam, drainage, 0).hydrologicGroup)).toEqual(['C', 'D', 'D'])
  })

  it('does not credit the subsoil with the organic matter of the topsoil', () => {
    const soil = fieldSoil({ sandPct: 5, clayPct: 50, organicMatterPct: 4.5 }, 'tiled', 0)
    expect(soil.subsoil.saturatedConductivityMmH).toBeLessThan(soil.properties.saturatedConductivityMmH / 2)
    const thin = fieldSoil({ sandPct: 88, clayPct: 5, organicMatterPct: 0.5 }, 'tiled', 0)
    expect(thin.subsoil).toEqual(thin.properties)
  })

  it('slows evaporation and runoff under residue', () => {
    const bare = fieldSoil({ sandPct: 25, clayPct: 50, organicMatterPct: 3 }, 'tiled', 0)
    const covered = fieldSoil({ sandPct: 25, clayPct: 50, organicMatterPct: 3 }, 'tiled', 60)
    expect(covered.residueFactor).toBeCloseTo(0.7, 12)
    expect(covered.curveNumber).toBeLessThan(bare.curveNumber)
  })

  it('has REW within TEW for every texture of the method', () => {
    for (let clayPct = 0; clayPct <= 60; clayPct += 5) {
      for (let sandPct = 0; sandPct <= 100 - clayPct; sandPct += 5) {
        const soil = fieldSoil({ sandPct, clayPct, organicMatterPct: 1 }, 'poor', 0)
        expect(soil.readilyEvaporableMm).toBeLessThanOrEqual(soil.totalEvaporableMm)
        expect(soil.fitWater).toBeLessThan(soil.properties.saturation)
        expect(soil.belowFitWater).toBeLessThan(soil.properties.saturation)
      }
    }
  })

  it('refuses what its methods refuse', () => {
    expect(() => fieldSoil({ sandPct: 25, clayPct: 50, organicMatterPct: 3 }, 'tiled', 130)).toThrow(RangeError)
    expect(() => fieldSoil({ sandPct: Number.NaN, clayPct: 50, organicMatterPct: 3 }, 'tiled', 0)).toThrow(RangeError)
  })
})
