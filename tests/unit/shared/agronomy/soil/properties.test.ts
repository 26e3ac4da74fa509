import { describe, expect, it } from 'vitest'
import { conductivityMmH, soilProperties, waterAtConductivity } from '../../../../../shared/agronomy/soil/properties'

describe('soilProperties', () => {
  // Saxton & Rawls (2006) Table 3, organic matter 2.5 %. First as printed (percent, and Ks in mm/h), then at full
  // precision recomputed from the equations: θ1500, θ33, θS, Ks, λ, density. Every residual is rounding.
  it.each([
    ['sand', 88, 5, [5, 10, 46, 108.1], [0.0502, 0.1028, 0.4617, 108.15, 0.1878, 1.426]],
    ['loam', 40, 20, [14, 28, 46, 15.5], [0.1370, 0.2796, 0.4595, 15.48, 0.1869, 1.432]],
    ['silt loam', 20, 15, [11, 31, 48, 16.1], [0.1099, 0.3052, 0.4787, 16.12, 0.2677, 1.381]],
    ['clay loam', 30, 35, [22, 36, 48, 4.3], [0.2180, 0.3579, 0.4772, 4.32, 0.1299, 1.385]],
    ['silty clay', 10, 45, [27, 41, 52, 3.7], [0.2678, 0.4091, 0.5235, 3.67, 0.1111, 1.263]],
    ['clay', 25, 50, [30, 42, 50, 1.1], [0.2979, 0.4206, 0.4984, 1.14, 0.0904, 1.329]],
  ])('reproduces Table 3: %s', (_, sandPct, clayPct, printed, [wilting, capacity, saturation, ks, index, density]) => {
    const soil = soilProperties({ sandPct, clayPct, organicMatterPct: 2.5 })
    expect([soil.wiltingPoint, soil.fieldCapacity, soil.saturation].map(water => Math.round(water * 100))).toEqual(printed.slice(0, 3))
    expect(soil.saturatedConductivityMmH.toFixed(1)).toBe(printed[3]!.toFixed(1))
    expect(soil.wiltingPoint).toBeCloseTo(wilting!, 4)
    expect(soil.fieldCapacity).toBeCloseTo(capacity!, 4)
    expect(soil.saturation).toBeCloseTo(saturation!, 4)
    expect(soil.saturatedConductivityMmH).toBeCloseTo(ks!, 2)
    expect(soil.poreIndex).toBeCloseTo(index!, 4)
    expect(soil.densityMgM3).toBeCloseTo(density!, 3)
  })

  it.each([['loam', 40, 20, 4.15], ['silt loam', 20, 15, 9.01], ['clay loam', 30, 35, 5.65], ['silty clay', 10, 45, 6.83], ['clay', 25, 50, 5.33]])('has the air entry of eq. 4: %s (recomputed)', (_, sandPct, clayPct, kpa) => {
    expect(soilProperties({ sandPct, clayPct, organicMatterPct: 2.5 }).airEntryKpa).toBeCloseTo(kpa, 2)
  })

  it('holds the air entry of sand at 0, where eq. 4 gives −0.96 kPa', () => {
    expect(soilProperties({ sandPct: 88, clayPct: 5, organicMatterPct: 2.5 }).airEntryKpa).toBe(0)
  })

  // Assumed typical textures of heavy northern soils, recomputed from the equations, to the digits given.
  it.each([
    ['silty clay 5/50, 4.5 %', 5, 50, 4.5, 0.292, 0.417, 0.558, 6.5, 1.17],
    ['clay loam 28/32, 5.5 %', 28, 32, 5.5, 0.213, 0.367, 0.538, 12.4, 1.22],
    ['silty clay loam 10/33, 4 %', 10, 33, 4, 0.208, 0.383, 0.543, 10.6, 1.21],
  ])('gives heavy soils %s', (_, sandPct, clayPct, organicMatterPct, wilting, capacity, saturation, ks, density) => {
    const soil = soilProperties({ sandPct, clayPct, organicMatterPct })
    expect(soil.wiltingPoint).toBeCloseTo(wilting, 3)
    expect(soil.fieldCapacity).toBeCloseTo(capacity, 3)
    expect(soil.saturation).toBeCloseTo(saturation, 3)
    expect(soil.saturatedConductivityMmH).toBeCloseTo(ks, 1)
    expect(soil.densityMgM3).toBeCloseTo(density, 2)
  })

  it('is not the copy with 1.238 in eq. 2, which gives clay 0.4139 and loam 0.2757', () => {
    expect(soilProperties({ sandPct: 25, clayPct: 50, organicMatterPct: 2.5 }).fieldCapacity).toBeGreaterThan(0.42)
    expect(soilProperties({ sandPct: 40, clayPct: 20, organicMatterPct: 2.5 }).fieldCapacity).toBeGreaterThan(0.279)
  })

  it('orders its water contents over the whole range of the method', () => {
    for (let clayPct = 0; clayPct <= 60; clayPct += 5) {
      for (let sandPct = 0; sandPct <= 100 - clayPct; sandPct += 5) {
        const soil = soilProperties({ sandPct, clayPct, organicMatterPct: 2.5 })
        expect(soil.wiltingPoint).toBeGreaterThan(0)
        expect(soil.fieldCapacity).toBeGreaterThan(soil.wiltingPoint)
        expect(soil.saturation).toBeGreaterThan(soil.fieldCapacity)
        expect(soil.saturation).toBeLessThan(0.7)
      }
    }
  })

  it('refuses the corners where the fit gives no curve, and only those', () => {
    expect(() => soilProperties({ sandPct: 100, clayPct: 0, organicMatterPct: 0.5 })).toThrow(/no water curve/)
    expect(() => soilProperties({ sandPct: 40, clayPct: 60, organicMatterPct: 5 })).toThrow(/no water curve/)
    expect(soilProperties({ sandPct: 100, clayPct: 0, organicMatterPct: 1 }).fieldCapacity).toBeGreaterThan(0)
  })

  it('refuses shares that are no soil or outside the method', () => {
    expect(() => soilProperties({ sandPct: 60, clayPct: 50, organicMatterPct: 2 })).toThrow(RangeError)
    expect(() => soilProperties({ sandPct: 10, clayPct: 61, organicMatterPct: 2 })).toThrow(RangeError)
    expect(() => soilProperties({ sandPct: 10, clayPct: 40, organicMatterPct: 9 })).toThrow(RangeError)
    expect(() => soilProperties({ sandPct: Number.NaN, clayPct: 40, organicMatterPct: 2 })).toThrow(RangeError)
    expect(() => soilProperties({ sandPct: 10, clayPct: 40, organicMatterPct: Number.NaN })).toThrow(RangeError)
  })
})

describe('conductivityMmH and waterAtConductivity', () => {
  // K at field capacity in mm/d and θ at 1 mm/d as a share of field capacity, recomputed from eq. 17 for Table 3 soils.
  it.each([
    ['clay', 25, 50, 0.386, 1.04],
    ['silty clay loam', 10, 35, 1.169, 0.99],
    ['clay loam', 30, 35, 0.521, 1.04],
    ['loam', 40, 20, 0.411, 1.07],
    ['sandy loam', 65, 10, 0.011, 1.43],
  ])('%s', (_, sandPct, clayPct, atCapacity, share) => {
    const soil = soilProperties({ sandPct, clayPct, organicMatterPct: 2.5 })
    expect(conductivityMmH(soil, soil.fieldCapacity) * 24).toBeCloseTo(atCapacity, 3)
    expect(waterAtConductivity(soil, 1 / 24) / soil.fieldCapacity).toBeCloseTo(share, 2)
  })

  it('undo each other', () => {
    const soil = soilProperties({ sandPct: 30, clayPct: 35, organicMatterPct: 4 })
    for (const rate of [0.01, 0.5, soil.saturatedConductivityMmH]) expect(conductivityMmH(soil, waterAtConductivity(soil, rate))).toBeCloseTo(rate, 10)
  })

  it('refuse water above saturation and rates above Ks', () => {
    const soil = soilProperties({ sandPct: 30, clayPct: 35, organicMatterPct: 4 })
    expect(() => conductivityMmH(soil, 0.9)).toThrow(RangeError)
    expect(() => conductivityMmH(soil, Number.NaN)).toThrow(RangeError)
    expect(() => waterAtConductivity(soil, 100)).toThrow(RangeError)
    expect(() => waterAtConductivity(soil, 0)).toThrow(RangeError)
  })
})
