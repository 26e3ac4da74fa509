import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { areaChance, chanceOfAmount, hourReaching, rainStartedBy } from '../../../../../shared/agronomy/weather/rain-chance'

// Published figures: shared/agronomy/figures. Here is what no table prints.

const share = fc.double({ min: 0, max: 1, noNaN: true })

describe('rainStartedBy', () => {
  it('never falls and lies between its bounds', () => {
    fc.assert(fc.property(fc.array(share, { minLength: 1, maxLength: 48 }), share, (chances, persistence) => {
      const { lowest, highest, independent, persistent } = rainStartedBy(chances, persistence)
      for (const [hour, chance] of persistent.entries()) {
        expect(chance).toBeGreaterThanOrEqual((persistent[hour - 1] ?? 0) - 1e-12)
        expect(chance).toBeGreaterThanOrEqual(lowest[hour]! - 1e-9)
        expect(chance).toBeLessThanOrEqual(highest[hour]! + 1e-9)
        expect(independent[hour]).toBeLessThanOrEqual(highest[hour]! + 1e-9)
      }
    }), { numRuns: 1000 })
  })

  it('is the independent one without persistence', () => {
    fc.assert(fc.property(fc.array(fc.double({ min: 0, max: 0.99, noNaN: true }), { minLength: 1, maxLength: 24 }), (chances) => {
      const { independent, persistent } = rainStartedBy(chances, 0)
      for (const [hour, chance] of persistent.entries()) expect(chance).toBeCloseTo(independent[hour]!, 9)
    }), { numRuns: 1000 })
  })

  it('stays certain after a certain hour', () => {
    expect(rainStartedBy([0.2, 1, 0, 0.3], 0.6).persistent.slice(1)).toEqual([1, 1, 1])
  })

  it('refuses chances that are none', () => {
    for (const wrong of [() => rainStartedBy([], 0.5), () => rainStartedBy([1.2], 0.5), () => rainStartedBy([Number.NaN], 0.5), () => rainStartedBy([0.5], 2), () => hourReaching([0.5], 0), () => chanceOfAmount(0, 1, 1), () => chanceOfAmount(0.5, 0, 1), () => chanceOfAmount(0.5, 1, -1), () => areaChance(2, 0.5)]) expect(wrong).toThrow(RangeError)
  })
})
