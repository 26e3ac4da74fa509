import { describe, expect, it } from 'vitest'
import { freezeRisk, SEEDLING_DAMAGE_C } from '../../../../../shared/agronomy/crop/freeze'

// Published figures: shared/agronomy/figures. Here is what no table prints.

describe('freeze', () => {
  it('never gets milder as it gets colder', () => {
    const order = ['none', 'watch', 'damage-likely']
    for (const crop of ['corn', 'soybean', 'dry bean'] as const) for (let f = 20; f < 40; f++) expect(order.indexOf(freezeRisk(f, crop, true))).toBeGreaterThanOrEqual(order.indexOf(freezeRisk(f + 1, crop, true)))
  })

  it('has the first damage warmer than the worst', () => {
    for (const [first, worst] of Object.values(SEEDLING_DAMAGE_C)) expect(first).toBeGreaterThan(worst)
  })

  it('refuses what is no temperature', () => {
    expect(() => freezeRisk(Number.NaN, 'corn', true)).toThrow(RangeError)
  })
})
