import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { dayAfter, daysBetween, guaranteeShare } from '../../../../../shared/agronomy/crop/late-planting'

// Published figures: shared/agronomy/figures. Here is what no table prints.

const rule = { finalDate: '2025-05-31', lateDays: 25, lossPctPerDay: 1, preventedPct: 55 }

describe('dates', () => {
  it('come back', () => {
    fc.assert(fc.property(fc.integer({ min: -2000, max: 2000 }), (days) => {
      expect(daysBetween('2024-02-28', dayAfter('2024-02-28', days))).toBe(days)
    }), { numRuns: 1000 })
  })

  it.each(['2025-02-30', '2025-13-01', '25-05-01', 'tomorrow', ''])('refuse %j', (day) => {
    expect(() => daysBetween(day, '2025-05-01')).toThrow(RangeError)
  })
})

describe('guaranteeShare', () => {
  it('never grows with a later day until the late period is over', () => {
    const shares = Array.from({ length: 40 }, (_, i) => guaranteeShare(dayAfter('2025-05-20', i), rule)!)
    for (let i = 1; i < shares.length; i++) expect(shares[i]).toBeLessThanOrEqual(shares[i - 1]!)
    expect(shares.at(-1)).toBe(0.55)
  })

  it('refuses periods that are none', () => {
    expect(() => guaranteeShare('2025-06-01', { ...rule, lossPctPerDay: 5 })).toThrow(RangeError)
    expect(() => dayAfter('2025-06-01', 0.5)).toThrow(RangeError)
  })
})
