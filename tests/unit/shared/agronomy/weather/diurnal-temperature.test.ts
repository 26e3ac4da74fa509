import { describe, expect, it } from 'vitest'
import { temperatureAtHour } from '../../../../../shared/agronomy/weather/diurnal-temperature'

const day = { minC: 3, maxC: 15, nextMinC: 3, sunrise: 5.5, sunset: 5.5 + 13.8 }

describe('temperatureAtHour', () => {
  // Parton & Logan (1981) with its constants for air at 150 cm, recomputed: sunrise 5.5, daylength 13.8 h, 3 to 15 °C.
  it.each([[14, 14.987], [21, 8.224]])('at %s h is %s °C', (hour, expected) => {
    expect(temperatureAtHour(hour, day)).toBeCloseTo(expected, 3)
  })

  it('is warmest 1.86 h after the middle of the day and coldest just before sunrise', () => {
    expect(temperatureAtHour((5.5 + 19.3) / 2 + 1.86, day)).toBeCloseTo(15, 10)
    expect(temperatureAtHour(5.5 - 0.17, day)).toBeCloseTo(3, 10)
  })

  it('stays between the extremes', () => {
    for (let hour = 0; hour <= 24; hour += 0.25) {
      expect(temperatureAtHour(hour, day)).toBeGreaterThanOrEqual(3)
      expect(temperatureAtHour(hour, day)).toBeLessThanOrEqual(15)
    }
  })

  it('falls in the evening towards the morning to come', () => {
    expect(temperatureAtHour(23, { ...day, nextMinC: -4 })).toBeLessThan(temperatureAtHour(23, day))
    expect(temperatureAtHour(4, { ...day, nextMinC: -4 })).toBe(temperatureAtHour(4, day))
    expect(temperatureAtHour(19.3, { ...day, nextMinC: -4 })).toBeCloseTo(temperatureAtHour(19.301, { ...day, nextMinC: -4 }), 2)
  })

  it('refuses reversed extremes, reversed sun and gaps', () => {
    expect(() => temperatureAtHour(12, { ...day, minC: 16 })).toThrow(RangeError)
    expect(() => temperatureAtHour(12, { ...day, maxC: Number.NaN })).toThrow(RangeError)
    expect(() => temperatureAtHour(12, { ...day, nextMinC: Number.NaN })).toThrow(RangeError)
    expect(() => temperatureAtHour(12, { ...day, sunrise: 20 })).toThrow(RangeError)
    expect(() => temperatureAtHour(25, day)).toThrow(RangeError)
  })
})
