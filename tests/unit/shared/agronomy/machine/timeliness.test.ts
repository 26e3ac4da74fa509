import { describe, expect, it } from 'vitest'
import { calendarDays, hoursToCatchUp, timelinessCostUsd } from '../../../../../shared/agronomy/machine/timeliness'

// Published figures: shared/agronomy/figures. Here is what no table prints.

const work = { lossPerDay: 0.005, acres: 1500, yieldPerAc: 45, priceUsd: 11, spread: 4 as const, hoursPerDay: 12, acresPerHour: 20, fitShare: 0.5 }

describe('timeliness', () => {
  it('grows with the square of the acres', () => {
    expect(timelinessCostUsd({ ...work, acres: 3000 })).toBeCloseTo(4 * timelinessCostUsd(work), 6)
  })

  it('catches up at once without a lead', () => {
    expect([hoursToCatchUp(0, 26, 21), hoursToCatchUp(10, 21, 21)]).toEqual([0, Infinity])
  })

  it('refuses what is none', () => {
    for (const wrong of [() => calendarDays({ ...work, fitShare: 0 }), () => calendarDays({ ...work, hoursPerDay: 30 }), () => timelinessCostUsd({ ...work, lossPerDay: 1 }), () => timelinessCostUsd({ ...work, priceUsd: -1 }), () => hoursToCatchUp(-1, 1, 1), () => hoursToCatchUp(1, Number.NaN, 1)]) expect(wrong).toThrow(RangeError)
  })
})
