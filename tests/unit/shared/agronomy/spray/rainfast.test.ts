import { describe, expect, it } from 'vitest'
import { MOST_RAIN_MM, runsReaching, staysDry } from '../../../../../shared/agronomy/spray/rainfast'

// Published figures: shared/agronomy/figures. Here is what no table prints.

const dry = { chance: 0, mm: 0 }

describe('staysDry', () => {
  it('does not guess beyond the forecast', () => {
    expect(staysDry([dry, dry], 4, 0.2)).toBeNull()
  })

  it('lets 0.02 in in all pass, and no more', () => {
    expect(staysDry([{ chance: 0.1, mm: MOST_RAIN_MM }], 1, 0.2)!.dry).toBe(true)
    expect(staysDry([{ chance: 0.1, mm: MOST_RAIN_MM + 0.01 }], 1, 0.2)!.dry).toBe(false)
  })

  it('needs nothing for a product that is fast at once', () => {
    expect(staysDry([], 0, 0.2)).toEqual({ dry: true, largestChance: 0, sumMm: 0 })
  })

  it('refuses what is none', () => {
    for (const wrong of [() => staysDry([dry], 1.5, 0.2), () => staysDry([dry], 1, 2), () => staysDry([{ chance: -1, mm: 0 }], 1, 0.2), () => staysDry([{ chance: 0, mm: Number.NaN }], 1, 0.2), () => runsReaching([], 1, 1), () => runsReaching([[1]], 2, 1), () => runsReaching([[1]], 1, -1)]) expect(wrong).toThrow(RangeError)
  })
})
