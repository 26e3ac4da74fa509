import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { brierParts, brierScore, brierSkill, crps, crpsNormal, crpsWeighted, intervalScore, pinballLoss } from '../../../../../shared/agronomy/weather/scores'

// Published figures: shared/agronomy/figures. Here is what no table prints.

const value = fc.double({ min: -50, max: 50, noNaN: true })
const values = fc.array(value, { minLength: 2, maxLength: 20 })
const cases = fc.array(fc.record({ chance: fc.integer({ min: 0, max: 10 }).map(tenth => tenth / 10), happened: fc.boolean() }), { minLength: 1, maxLength: 60 })

describe('scores', () => {
  it('split into Murphy’s parts exactly', () => {
    fc.assert(fc.property(cases, (given) => {
      const { reliability, resolution, uncertainty, groups } = brierParts(given)
      expect(reliability - resolution + uncertainty).toBeCloseTo(brierScore(given), 9)
      expect(groups.reduce((sum, { n }) => sum + n, 0)).toBe(given.length)
    }), { numRuns: 1000 })
  })

  it('have a CRPS that is the definition’s double sum, never negative, and the distance for one run', () => {
    fc.assert(fc.property(values, value, (runs, outcome) => {
      const n = runs.length
      const double = runs.reduce((sum, a) => sum + runs.reduce((inner, b) => inner + Math.abs(a - b), 0), 0)
      const distance = runs.reduce((sum, run) => sum + Math.abs(run - outcome), 0) / n
      expect(crps(runs, outcome)).toBeCloseTo(distance - double / (2 * n * n), 7)
      expect(crps(runs, outcome, true)).toBeCloseTo(distance - double / (2 * n * (n - 1)), 7)
      expect(crps(runs, outcome)).toBeGreaterThanOrEqual(-1e-9)
      expect(crps([outcome], outcome + 3)).toBeCloseTo(3, 9)
    }), { numRuns: 1000 })
  })

  it('weigh runs as if each were there as often as its weight', () => {
    fc.assert(fc.property(fc.array(fc.record({ run: value, weight: fc.integer({ min: 1, max: 4 }) }), { minLength: 1, maxLength: 8 }), value, (given, outcome) => {
      const repeated = given.flatMap(({ run, weight }) => Array<number>(weight).fill(run))
      expect(crpsWeighted(given.map(({ run }) => run), given.map(({ weight }) => weight), outcome)).toBeCloseTo(crps(repeated, outcome), 7)
    }), { numRuns: 1000 })
  })

  it('have no skill where nothing ever varied', () => {
    expect(brierSkill([{ chance: 0.9, happened: true }])).toBeNull()
  })

  it('refuse what is no forecast', () => {
    for (const wrong of [() => brierScore([]), () => brierScore([{ chance: 1.1, happened: true }]), () => crps([], 1), () => crps([1], 1, true), () => crps([Number.NaN], 1), () => crpsWeighted([1], [], 1), () => crpsWeighted([1], [0], 1), () => crpsWeighted([1], [-1], 1), () => crpsNormal(0, 0, 1), () => pinballLoss(0, 1, 1), () => intervalScore(0.2, 3, 1, 2)]) expect(wrong).toThrow(RangeError)
  })
})
