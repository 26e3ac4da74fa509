import { describe, expect, it } from 'vitest'
import { screenInversion } from '../../../../../shared/agronomy/weather/inversion'

// Published figures: shared/agronomy/figures. Here is what no table prints.

const still = { afterSunriseH: 13, toSunsetH: 0.5, sunDeg: 4, windMs: 1, cloudPct: 10, ceilingFt: null, aloftC: null }

describe('screenInversion', () => {
  it('takes warm air aloft for a sign by itself', () => {
    const noon = { ...still, afterSunriseH: 6, toSunsetH: 6, sunDeg: 55, windMs: 4 }
    expect(screenInversion(noon).chance).toBe('unlikely')
    expect(screenInversion({ ...noon, aloftC: 0.5 }).chance).toBe('possible')
  })

  it('needs a clear sky and still air in the hours before sunset', () => {
    const before = { ...still, toSunsetH: 2, afterSunriseH: 11.5, sunDeg: 18 }
    expect(screenInversion(before).chance).toBe('possible')
    expect(screenInversion({ ...before, cloudPct: 80 }).chance).toBe('unlikely')
    expect(screenInversion({ ...before, windMs: 5 }).chance).toBe('unlikely')
  })

  it('refuses a sky that is none', () => {
    expect(() => screenInversion({ ...still, cloudPct: 120 })).toThrow(RangeError)
    expect(() => screenInversion({ ...still, windMs: -1 })).toThrow(RangeError)
  })
})
