import { describe, expect, it } from 'vitest'
import { fallsAsSnow, meltableMm } from '../../../../../shared/agronomy/soil/snow'

const NEH_MM = 2.74

describe('meltableMm', () => {
  it('melts 0.06 in for each °F above freezing in a day: 2.743 mm/°C (NEH-630 ch. 11)', () => {
    expect(0.06 * 25.4 * 1.8).toBeCloseTo(2.743, 3)
    expect(meltableMm((42 - 32) / 1.8, 0.06 * 25.4 * 1.8, 24) / 25.4).toBeCloseTo(0.60, 10) // 42 °F
  })

  it('melts 13.7 mm at 5 °C in a day (recomputed), the same by the hour', () => {
    expect(meltableMm(5, NEH_MM, 24)).toBeCloseTo(13.7, 10)
    expect(24 * meltableMm(5, NEH_MM, 1)).toBeCloseTo(13.7, 10)
  })

  it('melts nothing in frost', () => {
    expect(meltableMm(0, NEH_MM, 24)).toBe(0)
    expect(meltableMm(-8, NEH_MM, 24)).toBe(0)
  })
})

describe('fallsAsSnow', () => {
  it('splits at 1.0 °C (SWAT, Ames reference set)', () => {
    expect(fallsAsSnow(1)).toBe(true)
    expect(fallsAsSnow(1.01)).toBe(false)
  })
})
