import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { boomWind, windByLogLaw, windByPowerLaw } from '../../../../../shared/agronomy/weather/wind-profile'

// Published figures: shared/agronomy/figures. Here is what no table prints.

const surface = { roughnessM: 0.03 }

describe('wind at another height', () => {
  it('comes back when it is brought there and back', () => {
    fc.assert(fc.property(fc.double({ min: 0, max: 50, noNaN: true }), fc.double({ min: 0.1, max: 80, noNaN: true }), (wind, height) => {
      expect(windByLogLaw(windByLogLaw(wind, 10, height, surface), height, 10, surface)).toBeCloseTo(wind, 9)
      expect(windByPowerLaw(windByPowerLaw(wind, 10, height, 0.2), height, 10, 0.2)).toBeCloseTo(wind, 9)
    }), { numRuns: 1000 })
  })

  it('grows with height', () => {
    fc.assert(fc.property(fc.double({ min: 0.2, max: 50, noNaN: true }), fc.double({ min: 0.01, max: 20, noNaN: true }), (height, more) => {
      expect(windByLogLaw(5, 10, height + more, surface)).toBeGreaterThan(windByLogLaw(5, 10, height, surface))
    }), { numRuns: 1000 })
  })

  it.each([[-1, 10, 2], [Number.NaN, 10, 2], [3, 0.02, 2], [3, 10, 0.03], [3, Infinity, 2]])('refuses %d m/s from %d to %d m', (wind, from, to) => {
    expect(() => windByLogLaw(wind, from, to, surface)).toThrow(RangeError)
  })

  it('refuses surfaces and exponents that are none', () => {
    expect(() => windByLogLaw(3, 10, 2, { roughnessM: 0 })).toThrow(RangeError)
    expect(() => windByLogLaw(3, 10, 2, { roughnessM: 0.1, displacementM: -1 })).toThrow(RangeError)
    expect(() => windByPowerLaw(3, 10, 2, 1.2)).toThrow(RangeError)
    expect(() => windByPowerLaw(3, 0, 2, 0.2)).toThrow(RangeError)
  })

  it('never holds a reduced wind against the most that is allowed', () => {
    expect(boomWind(6, 0.5)).toMatchObject({ forMostMs: 6 })
    expect(boomWind(6, 0.5).forLeastMs).toBeLessThan(3)
  })
})
