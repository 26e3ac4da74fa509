import { describe, expect, it } from 'vitest'
import { soilProperties } from '../../../../../shared/agronomy/soil/properties'
import { drainedMm, hoursToDrain } from '../../../../../shared/agronomy/soil/unit-gradient-drainage'

const soil = (sandPct: number, clayPct: number) => soilProperties({ sandPct, clayPct, organicMatterPct: 2.5 })

describe('hoursToDrain', () => {
  // Hours from saturation to field capacity for 100, 300 and 600 mm, recomputed from the closed form with the soils of
  // Saxton & Rawls (2006) Table 3; given to whole hours.
  it.each([
    ['clay', 25, 50, [107, 320, 639]],
    ['silty clay loam', 10, 35, [51, 152, 304]],
    ['clay loam', 30, 35, [94, 282, 565]],
    ['loam', 40, 20, [128, 385, 769]],
  ])('%s', (_, sandPct, clayPct, hours) => {
    const properties = soil(sandPct, clayPct)
    expect([100, 300, 600].map(depth => Math.round(hoursToDrain(properties, depth, properties.saturation, properties.fieldCapacity)))).toEqual(hours)
  })

  it('brackets the 450 h that Jabro et al. (2009) measured for a clay loam, where one travel time gives 8 h', () => {
    const properties = soil(30, 35)
    expect(hoursToDrain(properties, 300, properties.saturation, properties.fieldCapacity)).toBeLessThan(450)
    expect(hoursToDrain(properties, 600, properties.saturation, properties.fieldCapacity)).toBeGreaterThan(450)
  })

  it('never gets sandy loam to field capacity within a spring', () => {
    const properties = soil(65, 10)
    expect(hoursToDrain(properties, 100, properties.saturation, properties.fieldCapacity)).toBeGreaterThan(24 * 90)
  })

  it('refuses to drain upwards, from more than saturation, or to nothing', () => {
    const properties = soil(25, 50)
    expect(() => hoursToDrain(properties, 100, 0.3, 0.4)).toThrow(RangeError)
    expect(() => hoursToDrain(properties, 100, 0.6, 0.4)).toThrow(RangeError)
    expect(() => hoursToDrain(properties, 100, 0.4, 0)).toThrow(RangeError)
    expect(() => hoursToDrain(properties, 0, 0.45, 0.4)).toThrow(RangeError)
    expect(() => hoursToDrain(properties, 100, Number.NaN, 0.4)).toThrow(RangeError)
  })
})

describe('drainedMm', () => {
  // Saturated clay of Table 3, 100 mm, recomputed from the closed form.
  it.each([[1, 0.903], [6, 2.935], [24, 5.203], [96, 7.602]])('loses in %s h %s mm', (hours, mm) => {
    const properties = soil(25, 50)
    expect(drainedMm(properties, 100, 100 * properties.saturation, hours)).toBeCloseTo(mm, 3)
  })

  it('agrees with small explicit steps (0.01 h over a day)', () => {
    const properties = soil(25, 50)
    let water = 100 * properties.saturation
    for (let step = 0; step < 2400; step++) water -= 0.01 * properties.saturatedConductivityMmH * (water / 100 / properties.saturation) ** properties.conductivityExponent
    expect(100 * properties.saturation - water).toBeCloseTo(5.204, 3)
  })

  it('gives the same in two steps as in one, on both sides of the series', () => {
    for (const start of [0.45, 0.3, 0.2]) {
      const properties = soil(40, 20)
      const water = start * 100
      const first = drainedMm(properties, 100, water, 5)
      expect(first + drainedMm(properties, 100, water - first, 7)).toBeCloseTo(drainedMm(properties, 100, water, 12), 9)
    }
  })

  it('joins the series smoothly', () => {
    const properties = soil(25, 50)
    let before = 0
    for (let water = 25; water < 50; water += 0.001) {
      const now = drainedMm(properties, 100, water, 1)
      expect(now).toBeGreaterThanOrEqual(before)
      before = now
    }
  })

  it('takes nothing from an empty layer', () => {
    expect(drainedMm(soil(25, 50), 100, 0, 1)).toBe(0)
  })
})
