import fc from 'fast-check'
import { mean, sampleStandardDeviation } from 'simple-statistics'
import { describe, expect, it } from 'vitest'
import { meanStand, rowLengthFt, standFromHoop, standFromRow } from '../../../../../shared/agronomy/crop/stand'

// Published figures: shared/agronomy/figures. Here is what no table prints.

describe('stands', () => {
  it('are the same by row and by hoop over the same ground', () => {
    fc.assert(fc.property(fc.integer({ min: 1, max: 200 }), fc.double({ min: 10, max: 60, noNaN: true }), (count, diameter) => {
      const feet2 = Math.PI * (diameter / 24) ** 2
      expect(standFromRow(count, feet2 / (30 / 12), 30)).toBeCloseTo(standFromHoop(count, diameter), 4)
    }), { numRuns: 1000 })
  })

  it('have mean and error as simple-statistics has them', () => {
    fc.assert(fc.property(fc.array(fc.integer({ min: 0, max: 60_000 }), { minLength: 2, maxLength: 12 }), (stands) => {
      const stand = meanStand(stands)
      expect(stand.mean).toBeCloseTo(mean(stands), 6)
      expect(stand.standardError).toBeCloseTo(sampleStandardDeviation(stands) / Math.sqrt(stands.length), 6)
    }), { numRuns: 1000 })
    expect(meanStand([30_000])).toEqual({ mean: 30_000, standardError: null, counts: 1 })
  })

  it('are not the misprint of 36 ft for 20 in rows', () => {
    expect(rowLengthFt(20)).toBeLessThan(27)
  })

  it('refuse counts that are none', () => {
    for (const wrong of [() => rowLengthFt(0), () => standFromRow(-1, 10, 30), () => standFromRow(1, 0, 30), () => standFromHoop(1, 0), () => meanStand([]), () => meanStand([-1])]) expect(wrong).toThrow(RangeError)
  })
})
