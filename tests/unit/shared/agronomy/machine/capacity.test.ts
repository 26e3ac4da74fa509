import { describe, expect, it } from 'vitest'
import { capacityAcPerHour, hoursForArea } from '../../../../../shared/agronomy/machine/capacity'

describe('capacityAcPerHour', () => {
  // Iowa State Extension A3-24, table of capacities, to the printed digit.
  it.each([
    ['fertilizer spreader', 40, 6, 0.7, 20.4],
    ['fertilizer spreader', 60, 12, 0.68, 59.3],
    ['manure spreader', 15, 5, 0.63, 5.7],
    ['manure spreader', 36, 5, 0.6, 13.1],
    ['ammonia, 15 knives', 37.5, 6, 0.65, 17.7],
    ['plow, 6 × 16 in', 8, 5, 0.85, 4.1],
  ])('%s, %d ft at %d mph, efficiency %d: %d ac/h', (_, widthFt, speedMph, fieldEfficiency, printed) => {
    const digits = (value: number) => Math.round(value * 10) / 10
    expect(digits(capacityAcPerHour({ widthFt, speedMph, fieldEfficiency }))).toBe(printed)
  })

  // Hanna's example as quoted in a trade article: 30 ft at 5 mph, 18.2 theoretical, 14.5 at 80 %, 10.9 at 60 %.
  it.each([[1, 18.2], [0.8, 14.5], [0.6, 10.9]])('30 ft at 5 mph and efficiency %d does %d ac/h', (fieldEfficiency, printed) => {
    expect(Math.abs(capacityAcPerHour({ widthFt: 30, speedMph: 5, fieldEfficiency }) - printed)).toBeLessThanOrEqual(0.051)
  })

  it('agrees with acres swept in an hour: 8.25 is 43,560 ft² over 5,280 ft', () => {
    expect(capacityAcPerHour({ widthFt: 43_560 / 5280, speedMph: 1, fieldEfficiency: 1 })).toBeCloseTo(1, 12)
  })

  it.each([
    { widthFt: 0, speedMph: 5, fieldEfficiency: 0.8 },
    { widthFt: 30, speedMph: Number.NaN, fieldEfficiency: 0.8 },
    { widthFt: 30, speedMph: 5, fieldEfficiency: 1.2 },
    { widthFt: 30, speedMph: 5, fieldEfficiency: 80 },
  ])('refuses $widthFt ft, $speedMph mph, efficiency $fieldEfficiency', (working) => {
    expect(() => capacityAcPerHour(working)).toThrow(RangeError)
  })
})

describe('hoursForArea', () => {
  it('is the area over the rate, and nothing for no area', () => {
    expect(hoursForArea(160, 20)).toBe(8)
    expect(hoursForArea(0, 20)).toBe(0)
  })

  it.each([[-1, 20], [160, 0], [Number.NaN, 20]])('refuses %d ac at %d ac/h', (area, rate) => {
    expect(() => hoursForArea(area, rate)).toThrow(RangeError)
  })
})
