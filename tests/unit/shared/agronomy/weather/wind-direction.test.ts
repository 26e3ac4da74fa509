import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { blowsTo, compassPoint, meanWind, offAxisDeg } from '../../../../../shared/agronomy/weather/wind-direction'

// Published figures: shared/agronomy/figures. Here is what no table prints.

const anyDeg = fc.double({ min: -720, max: 720, noNaN: true })

describe('directions', () => {
  it('stay within the circle, and an angle within half of it, the same seen from either side', () => {
    fc.assert(fc.property(anyDeg, anyDeg, (from, bearing) => {
      expect(blowsTo(from)).toBeGreaterThanOrEqual(0)
      expect(blowsTo(from)).toBeLessThan(360)
      expect(offAxisDeg(from, bearing)).toBeGreaterThanOrEqual(0)
      expect(offAxisDeg(from, bearing)).toBeLessThanOrEqual(180)
      expect(offAxisDeg(from, bearing)).toBeCloseTo(offAxisDeg(from + 360, bearing - 360), 6)
    }), { numRuns: 1000 })
  })

  it('have no mean where winds cancel out', () => {
    expect(meanWind([{ speed: 5, fromDeg: 90 }, { speed: 5, fromDeg: 270 }])).toEqual({ speed: expect.closeTo(0, 9), fromDeg: null })
  })

  it('turn a mean with all its winds', () => {
    fc.assert(fc.property(fc.array(fc.record({ speed: fc.double({ min: 1, max: 20, noNaN: true }), fromDeg: fc.double({ min: 0, max: 80, noNaN: true }) }), { minLength: 1, maxLength: 5 }), fc.integer({ min: 0, max: 360 }), (winds, turn) => {
      const mean = meanWind(winds)
      const turned = meanWind(winds.map(({ speed, fromDeg }) => ({ speed, fromDeg: fromDeg + turn })))
      expect(turned.speed).toBeCloseTo(mean.speed, 6)
      expect(offAxisDeg(turned.fromDeg!, blowsTo(mean.fromDeg! + turn))).toBeCloseTo(0, 5)
    }), { numRuns: 1000 })
  })

  it('refuse what is no direction and no wind', () => {
    for (const wrong of [() => blowsTo(Number.NaN), () => offAxisDeg(0, Infinity), () => compassPoint(Number.NaN), () => meanWind([]), () => meanWind([{ speed: -1, fromDeg: 0 }])]) expect(wrong).toThrow(RangeError)
  })
})
