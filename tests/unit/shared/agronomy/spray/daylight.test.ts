import { describe, expect, it } from 'vitest'
import { isWholeHourWithin, sprayDaylight } from '../../../../../shared/agronomy/spray/daylight'

// Published figures: shared/agronomy/figures. Here is what no table prints.

const [sunrise, sunset] = [new Date('2026-05-15T11:00Z'), new Date('2026-05-16T01:00Z')]

describe('sprayDaylight', () => {
  it('is none where the sun does not set, or nothing is left of the day', () => {
    expect(sprayDaylight({ sunrise: null, sunset: null }, { afterSunriseH: 1, beforeSunsetH: 2 })).toBeNull()
    expect(sprayDaylight({ sunrise, sunset }, { afterSunriseH: 8, beforeSunsetH: 6 })).toBeNull()
    expect(isWholeHourWithin(sunrise, null)).toBe(false)
  })

  it('takes an hour that ends with it', () => {
    const window = sprayDaylight({ sunrise, sunset }, { afterSunriseH: 1, beforeSunsetH: 2 })!
    expect([isWholeHourWithin(new Date('2026-05-15T22:00Z'), window), isWholeHourWithin(new Date('2026-05-15T22:30Z'), window)]).toEqual([true, false])
  })

  it('refuses hours that are none', () => {
    expect(() => sprayDaylight({ sunrise, sunset }, { afterSunriseH: -1, beforeSunsetH: 2 })).toThrow(RangeError)
    expect(() => isWholeHourWithin(new Date(Number.NaN), null)).toThrow(RangeError)
  })
})
