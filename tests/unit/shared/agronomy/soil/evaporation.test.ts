import { describe, expect, it } from 'vitest'
import { dryingFactor, READILY_EVAPORABLE_MM, residueFactor, totalEvaporableMm } from '../../../../../shared/agronomy/soil/evaporation'

/** Days of FAO-56 example 31 (p. 146): bare loam, TEW 20, REW 9, Kc max 1.20, ETo 4.5 mm/d. */
function tenDays(coefficient: number): { factor: number, evaporated: number, depletion: number }[] {
  let depletion = 0
  return Array.from({ length: 10 }, () => {
    const factor = dryingFactor(depletion, 9, 20)
    const evaporated = factor * coefficient * 4.5
    depletion += evaporated
    return { factor, evaporated, depletion }
  })
}

describe('dryingFactor', () => {
  // FAO-56 Ex. 31 as printed, Kcb 0.15; every figure to its two decimals.
  it('reproduces FAO-56 example 31', () => {
    const days = tenDays(1.2 - 0.15)
    expect(days.map(day => day.factor.toFixed(2))).toEqual(['1.00', '1.00', '0.96', '0.55', '0.31', '0.18', '0.10', '0.06', '0.03', '0.02'])
    const evaporated = [4.73, 4.73, 4.53, 2.59, 1.47, 0.84, 0.48, 0.27, 0.16, 0.09]
    const depletion = [4.73, 9.45, 13.98, 16.57, 18.04, 18.88, 19.36, 19.64, 19.79, 19.88]
    for (const [index, day] of days.entries()) {
      expect(Math.abs(day.evaporated - evaporated[index]!)).toBeLessThanOrEqual(0.0051)
      expect(Math.abs(day.depletion - depletion[index]!)).toBeLessThanOrEqual(0.0051)
      expect(Math.abs(day.evaporated + 0.15 * 4.5 - [5.4, 5.4, 5.2, 3.3, 2.1, 1.5, 1.2, 0.9, 0.8, 0.8][index]!)).toBeLessThanOrEqual(0.051)
    }
  })

  it('gives the same with all of it taken from the surface, Kcb 0 (recomputed)', () => {
    const depletion = [5.40, 10.80, 15.32, 17.62, 18.79, 19.38, 19.69, 19.84, 19.92, 19.96]
    for (const [index, day] of tenDays(1.2).entries()) expect(Math.abs(day.depletion - depletion[index]!)).toBeLessThanOrEqual(0.0051)
  })

  it('is 1 up to REW and 0 from TEW', () => {
    expect(dryingFactor(9, 9, 20)).toBe(1)
    expect(dryingFactor(20, 9, 20)).toBe(0)
    expect(dryingFactor(25, 9, 20)).toBe(0)
  })
})

describe('totalEvaporableMm', () => {
  it('counts half the wilting point (FAO-56 eq. 73): 27.06 mm for clay', () => {
    expect(totalEvaporableMm(0.4198204676875, 0.298345, 0.1)).toBeCloseTo(27.06, 2)
  })

  it('refuses a reversed range and no depth', () => {
    expect(() => totalEvaporableMm(0.2, 0.3, 0.1)).toThrow(RangeError)
    expect(() => totalEvaporableMm(Number.NaN, 0.1, 0.1)).toThrow(RangeError)
    expect(() => totalEvaporableMm(0.3, 0.1, 0)).toThrow(RangeError)
  })
})

describe('READILY_EVAPORABLE_MM', () => {
  // FAO-56 Table 19 (p. 144): lowest and highest REW of each row.
  it.each([
    ['sand', 2, 7], ['loamy sand', 4, 8], ['sandy loam', 6, 10], ['loam', 8, 10], ['silt loam', 8, 11], ['silt', 8, 11],
    ['silty clay loam', 8, 11], ['silty clay', 8, 12], ['clay', 8, 12],
  ] as const)('is the middle of the row of %s', (name, low, high) => {
    expect(READILY_EVAPORABLE_MM[name]).toBe((low + high) / 2)
  })
})

describe('residueFactor', () => {
  // FAO-56 p. 198: 5 % less for each 10 % of cover.
  it.each([[0, 1], [30, 0.85], [50, 0.75], [80, 0.6]])('%s %% cover leaves %s', (cover, factor) => {
    expect(residueFactor(cover)).toBeCloseTo(factor, 12)
  })

  it('refuses cover outside 0 to 100 %', () => {
    expect(() => residueFactor(101)).toThrow(RangeError)
    expect(() => residueFactor(Number.NaN)).toThrow(RangeError)
  })
})
