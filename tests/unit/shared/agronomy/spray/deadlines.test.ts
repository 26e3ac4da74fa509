import { describe, expect, it } from 'vitest'
import { hoursAfter, RECORD_RULES, RESCINDED_RULE, restrictedEntryHours } from '../../../../../shared/agronomy/spray/deadlines'

// Published figures: shared/agronomy/figures. Here is what no table prints.

describe('deadlines', () => {
  it('never cite the rescinded federal rule as one in force', () => {
    expect(RECORD_RULES.map(({ name }) => name).join()).not.toContain('110.3')
    expect(RESCINDED_RULE).toEqual({ name: '7 CFR 110.3', since: '2025-07-11' })
    expect(RECORD_RULES.every(({ asOf }) => asOf.length > 0)).toBe(true)
  })

  it('refuse what is none', () => {
    for (const wrong of [() => hoursAfter(new Date(Number.NaN), 1), () => hoursAfter(new Date(), -1), () => restrictedEntryHours([]), () => restrictedEntryHours([-1])]) expect(wrong).toThrow(RangeError)
  })
})
