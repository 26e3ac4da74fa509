import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { dayReaching, degreeDays, degreeDaysAveraged, degreeDaysClipped, degreeDaysHourly, degreeDaysSine, degreeDaysToC, DEGREE_DAY_RULES, sumDegreeDays } from '../../../../../shared/agronomy/crop/degree-days'

// Published figures: shared/agronomy/figures. Here is what no table prints.

const day = fc.tuple(fc.double({ min: -40, max: 120, noNaN: true }), fc.double({ min: 0, max: 60, noNaN: true })).map(([min, range]) => ({ min, max: min + range }))

describe('degree days', () => {
  it('lie between 0 and cap less base, by every method, and the sine between the two others without a cap', () => {
    fc.assert(fc.property(day, ({ min, max }) => {
      for (const of of [degreeDaysClipped, degreeDaysAveraged, degreeDaysSine]) {
        expect(of(min, max, 50, 86)).toBeGreaterThanOrEqual(0)
        expect(of(min, max, 50, 86)).toBeLessThanOrEqual(36 + 1e-9)
      }
      expect(degreeDaysSine(min, max, 50, null)).toBeGreaterThanOrEqual(degreeDaysAveraged(min, max, 50, null) - 1e-9)
      expect(degreeDaysSine(min, max, 50, null)).toBeLessThanOrEqual(degreeDaysClipped(min, max, 50, null) + 1e-9)
    }), { numRuns: 1000 })
  })

  it('by sine are the mean of the sine itself', () => {
    fc.assert(fc.property(day, ({ min, max }) => {
      const n = 20_000
      let sum = 0
      for (let i = 0; i < n; i++) sum += Math.min(86, Math.max(50, (max + min) / 2 + (max - min) / 2 * Math.sin(2 * Math.PI * (i + 0.5) / n))) - 50
      expect(degreeDaysSine(min, max, 50, 86)).toBeCloseTo(sum / n, 2)
    }), { numRuns: 100 })
  })

  it('say which days a sum lacks, with its method', () => {
    expect(sumDegreeDays([{ day: '2025-05-05', min: 50, max: 60 }, { day: '2025-05-06', min: null, max: 70 }], DEGREE_DAY_RULES.corn)).toEqual({ ...DEGREE_DAY_RULES.corn, sum: 5, firstDay: '2025-05-05', lastDay: '2025-05-06', missingDays: ['2025-05-06'] })
    expect(sumDegreeDays([], DEGREE_DAY_RULES.corn)).toMatchObject({ sum: 0, firstDay: null, lastDay: null })
  })

  it('flag a day with a gap', () => {
    expect(degreeDaysHourly([60, 70], 50, 86)).toEqual({ degreeDays: 15, hours: 2 })
  })

  it('are not the misprints: (max − min)/2 − base and (min + max/2) − base', () => {
    expect(degreeDays(60, 80, DEGREE_DAY_RULES.corn)).not.toBe((80 - 60) / 2 - 50)
    expect(degreeDays(60, 80, DEGREE_DAY_RULES.corn)).not.toBe(60 + 80 / 2 - 50)
    expect(degreeDaysToC(32)).not.toBe(0)
  })

  it('never reach what the days don’t hold', () => {
    expect(dayReaching([{ day: '2025-05-05', min: 50, max: 60 }], DEGREE_DAY_RULES.corn, 6)).toBeNull()
  })

  it('refuse swapped extremes, caps under the base, and hours that are none', () => {
    for (const wrong of [() => degreeDaysClipped(60, 50, 50, 86), () => degreeDaysSine(Number.NaN, 50, 50, 86), () => degreeDaysAveraged(40, 50, 50, 40), () => degreeDaysHourly([], 50, 86), () => degreeDaysHourly([Number.NaN], 50, 86), () => dayReaching([], DEGREE_DAY_RULES.corn, -1)]) expect(wrong).toThrow(RangeError)
  })
})
