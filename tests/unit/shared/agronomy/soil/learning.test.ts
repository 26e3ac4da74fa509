import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { cumulativeStdNormalProbability } from 'simple-statistics'
import { chanceOfCall, normalShare, rainWithGauge, withCall, withProbe } from '../../../../../shared/agronomy/soil/learning'

// Published figures: shared/agronomy/figures. Here is what no table prints.
const spread = fc.double({ min: 0.005, max: 0.08, noNaN: true })
const over = fc.double({ min: -0.08, max: 0.08, noNaN: true })

describe('withCall', () => {
  it('moves to the side that was called and never widens', () => {
    fc.assert(fc.property(over, spread, fc.constantFrom('fit' as const, 'not-fit' as const), (value, s, call) => {
      const after = withCall({ value, spread: s }, call)
      expect(call === 'fit' ? after.value <= value : after.value >= value).toBe(true)
      expect(after.spread).toBeGreaterThan(0)
      expect(after.chance).toBeGreaterThan(0)
      expect(after.chance).toBeLessThan(1)
    }), { numRuns: 1000 })
  })

  it('gives the two calls chances that add up to one, and mirrors them', () => {
    fc.assert(fc.property(over, spread, (value, s) => {
      expect(withCall({ value, spread: s }, 'fit').chance + withCall({ value, spread: s }, 'not-fit').chance).toBeCloseTo(1, 9)
      expect(withCall({ value, spread: s }, 'fit').value).toBeCloseTo(-withCall({ value: -value, spread: s }, 'not-fit').value, 9)
      expect(chanceOfCall('fit', value) + chanceOfCall('not-fit', value)).toBeCloseTo(1, 9)
    }), { numRuns: 1000 })
  })
})

describe('readings', () => {
  it('end between belief and reading, and narrow it', () => {
    fc.assert(fc.property(fc.double({ min: 0.1, max: 60, noNaN: true }), fc.double({ min: 0.1, max: 60, noNaN: true }), fc.double({ min: 0.05, max: 0.6, noNaN: true }), fc.double({ min: 0.05, max: 0.6, noNaN: true }), (before, reading, s, r) => {
      for (const after of [rainWithGauge({ value: before, spread: s }, { value: reading, spread: r }), withProbe({ value: before, spread: s }, { value: reading, spread: r })]) {
        expect(after.value).toBeGreaterThanOrEqual(Math.min(before, reading) - 1e-9)
        expect(after.value).toBeLessThanOrEqual(Math.max(before, reading) + 1e-9)
        expect(after.spread).toBeLessThan(s)
      }
    }), { numRuns: 1000 })
  })

  it('refuse spreads and rain that are none', () => {
    for (const wrong of [() => rainWithGauge({ value: 0, spread: 0.5 }, { value: 10, spread: 0.1 }), () => withProbe({ value: 0.4, spread: 0 }, { value: 0.3, spread: 0.1 }), () => withProbe({ value: Number.NaN, spread: 0.1 }, { value: 0.3, spread: 0.1 }), () => withCall({ value: 0, spread: -1 }, 'fit'), () => normalShare(Number.NaN)]) expect(wrong).toThrow(RangeError)
  })
})

describe('normalShare', () => {
  it('agrees with simple-statistics, which rounds to four places of a table, over 1,000 points', () => {
    for (let i = 0; i < 1000; i++) {
      const z = -3 + 6 * i / 999
      expect(Math.abs(normalShare(z) - cumulativeStdNormalProbability(z))).toBeLessThan(0.003)
    }
    expect(normalShare(0)).toBe(0.5)
    expect(normalShare(1.959963984540054)).toBeCloseTo(0.975, 12)
    expect([normalShare(-40), normalShare(40)]).toEqual([0, 1])
  })
})
