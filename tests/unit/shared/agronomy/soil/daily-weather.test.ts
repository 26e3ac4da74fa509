import { describe, expect, it } from 'vitest'
import { halfSineShare, spreadDays, type DailyWeather } from '../../../../../shared/agronomy/soil/daily-weather'
import { estimatedReferenceEt, estimatedRadiation } from '../../../../../shared/agronomy/weather/daily-estimate'
import { hourlyReferenceEt } from '../../../../../shared/agronomy/weather/reference-evapotranspiration'
import { HALF_SINE } from './even-weather'

const place = { latitudeDeg: 47, elevationM: 270, coastal: false, utcOffsetHours: -6 }
const FIRST_DAY = Date.UTC(2015, 3, 20) / 86_400_000
const APRIL_20 = 110

function threeDays(change: Partial<DailyWeather> = {}): DailyWeather {
  return { firstDay: FIRST_DAY, rainMm: Float64Array.of(0, 12, 3), minC: Float64Array.of(2, 5, -1), maxC: Float64Array.of(14, 11, 8), windMs: Float64Array.of(4, 7, 2), ...change }
}

describe('halfSineShare', () => {
  // Soil model reference, section 11.1: the shares of 6 to 19 h, to four digits.
  it('spreads a day over 6 to 19 h by a half sine', () => {
    for (let hour = 0; hour < 24; hour++) expect(halfSineShare(hour)).toBeCloseTo(HALF_SINE[hour - 6] ?? 0, 4)
    expect(Array.from({ length: 24 }, (_, hour) => halfSineShare(hour)).reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 12)
  })
})

describe('spreadDays', () => {
  const sumOfDay = (values: Float64Array, day: number) => values.subarray(day * 24, day * 24 + 24).reduce((sum, value) => sum + value, 0)

  it('keeps each day’s rain, evapotranspiration and radiation', () => {
    const { weather, etoMm } = spreadDays(threeDays(), place, 18)
    for (let day = 0; day < 3; day++) {
      const [minC, maxC, wind] = [threeDays().minC[day]!, threeDays().maxC[day]!, threeDays().windMs[day]!]
      expect(sumOfDay(weather.rainMm, day)).toBeCloseTo(threeDays().rainMm[day]!, 10)
      expect(sumOfDay(etoMm, day)).toBeCloseTo(estimatedReferenceEt(minC, maxC, wind, place, APRIL_20 + day), 10)
      expect(sumOfDay(weather.radiationWm2, day) * 3600 / 1e6).toBeCloseTo(estimatedRadiation(minC, maxC, place, APRIL_20 + day), 8)
    }
  })

  it('lets it rain in six hours from the hour that is given', () => {
    const { weather } = spreadDays(threeDays(), place, 6)
    expect([...weather.rainMm.subarray(24, 48)]).toEqual(Array.from({ length: 24 }, (_, hour) => hour >= 6 && hour < 12 ? 2 : 0))
  })

  it('begins at local midnight, in hours of standard time', () => {
    const { weather, localHour } = spreadDays(threeDays(), place, 0)
    expect(new Date(weather.startsAt * 1000).toISOString()).toBe('2015-04-20T06:00:00.000Z')
    expect([weather.hours, localHour[0], localHour[25], localHour[71]]).toEqual([72, 0, 1, 23])
  })

  it('stays within each day’s extremes until sunset and comes near them', () => {
    const { weather } = spreadDays(threeDays(), place, 0)
    for (let day = 0; day < 3; day++) {
      const untilEvening = weather.temperatureC.subarray(day * 24, day * 24 + 18)
      expect(Math.min(...untilEvening)).toBeGreaterThanOrEqual(threeDays().minC[day]!)
      expect(Math.max(...untilEvening)).toBeLessThanOrEqual(threeDays().maxC[day]!)
      expect(Math.max(...untilEvening)).toBeGreaterThan(threeDays().maxC[day]! - 0.2)
    }
  })

  it('gives hours that the hourly method takes, within a third of the daily one', () => {
    const { weather, etoMm } = spreadDays(threeDays(), place, 0)
    const hourly = hourlyReferenceEt(weather, { ...place, longitudeDeg: -90 })
    for (let day = 0; day < 3; day++) expect(Math.abs(sumOfDay(hourly, day) / sumOfDay(etoMm, day) - 1)).toBeLessThan(1 / 3)
    expect(Math.max(...weather.humidityPct)).toBeLessThanOrEqual(100)
  })

  it('names the day of a gap or of an impossible value', () => {
    expect(() => spreadDays(threeDays({ rainMm: Float64Array.of(0, Number.NaN, 0) }), place, 0)).toThrow(/day 1/)
    expect(() => spreadDays(threeDays({ rainMm: Float64Array.of(0, -1, 0) }), place, 0)).toThrow(RangeError)
    expect(() => spreadDays(threeDays({ minC: Float64Array.of(2, 12, 0) }), place, 0)).toThrow(/day 1/)
    expect(() => spreadDays(threeDays({ windMs: Float64Array.of(2, 3, Number.NaN) }), place, 0)).toThrow(/day 2/)
    expect(() => spreadDays(threeDays({ windMs: Float64Array.of(2, 3) }), place, 0)).toThrow(RangeError)
    expect(() => spreadDays(threeDays(), place, 19)).toThrow(RangeError)
    expect(() => spreadDays(threeDays(), place, 1.5)).toThrow(RangeError)
  })
})
