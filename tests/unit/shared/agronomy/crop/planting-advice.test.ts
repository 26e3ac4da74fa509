import { describe, expect, it } from 'vitest'
import { CHILL_RULES, plantingAdvice } from '../../../../../shared/agronomy/crop/planting-advice'

// Published figures: shared/agronomy/figures. Here is what no table prints.

const warm = { meanF: 55, coldest: { f: 52, inHours: 10 }, rainIn: 0, pastOverride: false }

describe('plantingAdvice', () => {
  it('lets the calendar outweigh the thermometer late, but not cold rain', () => {
    expect(plantingAdvice({ ...warm, meanF: 47, pastOverride: true }, CHILL_RULES.corn)).toBe('go')
    expect(plantingAdvice({ ...warm, meanF: 47, pastOverride: true, coldest: { f: 42, inHours: 20 }, rainIn: 0.3 }, CHILL_RULES.corn)).toBe('hold-chill')
  })

  it('takes cold without rain for a caution', () => {
    expect(plantingAdvice({ ...warm, coldest: { f: 42, inHours: 20 } }, CHILL_RULES.corn)).toBe('caution')
  })

  it('refuses what is not known', () => {
    expect(() => plantingAdvice({ ...warm, meanF: Number.NaN }, CHILL_RULES.corn)).toThrow(RangeError)
    expect(() => plantingAdvice({ ...warm, rainIn: -1 }, CHILL_RULES.corn)).toThrow(RangeError)
  })
})
