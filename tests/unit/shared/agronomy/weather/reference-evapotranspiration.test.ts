import { describe, expect, it } from 'vitest'
import type { HourlyWeather } from '../../../../../shared/agronomy/weather/hourly'
import {
  airPressureKpa, dailySaturationVapourPressure, psychrometricConstant, saturationVapourPressure, vapourPressureFromExtremes, vapourPressureSlope,
} from '../../../../../shared/agronomy/weather/humidity'
import { clearSkyRadiation, daylightHours, extraterrestrialDay, radiationFromSunshine } from '../../../../../shared/agronomy/weather/radiation'
import {
  hargreavesSamani, hourlyReferenceEt, netRadiationHour, penmanMonteithDay, penmanMonteithHour, type DailyWeather,
} from '../../../../../shared/agronomy/weather/reference-evapotranspiration'
import { windAt2m } from '../../../../../shared/agronomy/weather/wind'

/** FAO-56 example 18, p. 72: Uccle, 6 July. */
function uccle(): DailyWeather {
  const extraterrestrial = extraterrestrialDay(50.8, 187)
  return {
    minC: 12.3,
    maxC: 21.5,
    vapourKpa: vapourPressureFromExtremes(12.3, 21.5, 63, 84),
    wind2mMs: windAt2m(10 / 3.6, 10),
    radiation: radiationFromSunshine(9.25, daylightHours(50.8, 187), extraterrestrial),
    clearSky: clearSkyRadiation(extraterrestrial, 100),
    elevationM: 100,
  }
}

describe('penmanMonteithDay', () => {
  it('gives 3.88 mm at Uccle (FAO-56 example 18, p. 72; full figure 3.8803)', () => {
    const day = uccle()
    expect(day.wind2mMs).toBeCloseTo(2.078, 3)
    expect(day.vapourKpa).toBeCloseTo(1.409, 3)
    expect(day.radiation).toBeCloseTo(22.072, 3)
    expect(day.clearSky).toBeCloseTo(30.898, 3)
    expect(penmanMonteithDay(day)).toBeCloseTo(3.8803, 4)
  })

  it('would give 3.97 with the wind left at 10 m and 4.39 with km/h taken for m/s: neither is what we answer', () => {
    expect(penmanMonteithDay({ ...uccle(), wind2mMs: 10 / 3.6 })).toBeCloseTo(3.97, 2)
    expect(penmanMonteithDay({ ...uccle(), wind2mMs: windAt2m(10, 10) })).toBeCloseTo(4.39, 2)
  })

  it('would give 3.75 with the saturation pressure of the mean temperature, and take 1.528 kPa with the humidities paired the wrong way', () => {
    const mean = (12.3 + 21.5) / 2
    const slope = vapourPressureSlope(mean)
    const gamma = psychrometricConstant(airPressureKpa(100))
    const wind = uccle().wind2mMs
    const missing = dailySaturationVapourPressure(12.3, 21.5) - saturationVapourPressure(mean)
    expect(uccle().vapourKpa).not.toBeCloseTo(1.528, 2)
    expect(vapourPressureFromExtremes(12.3, 21.5, 84, 63)).toBeCloseTo(1.528, 3)
    expect(penmanMonteithDay(uccle()) - gamma * 900 / (mean + 273) * wind * missing / (slope + gamma * (1 + 0.34 * wind))).toBeCloseTo(3.75, 2)
  })

  // Computed from FAO-56 eq 6 with albedo 0.23, G = 0, wind given at 2 m, dew point known.
  it.each([
    ['cool cloudy 25 April, 45° N', 45, 250, 115, 2, 10, 1, 3.5, 0.35, 35.53, 1.91, 2.24],
    ['cold clear 5 April, 48° N', 48, 270, 95, -3, 7, -4, 4.0, 0.95, 29.47, 2.21, 1.73],
  ])('holds in a northern spring: %s', (_, latitude, elevationM, day, minC, maxC, dewC, wind2mMs, share, ra, penman, hargreaves) => {
    const extraterrestrial = extraterrestrialDay(latitude, day)
    const clearSky = clearSkyRadiation(extraterrestrial, elevationM)
    expect(extraterrestrial).toBeCloseTo(ra, 2)
    expect(penmanMonteithDay({ minC, maxC, vapourKpa: saturationVapourPressure(dewC), wind2mMs, radiation: share * clearSky, clearSky, elevationM })).toBeCloseTo(penman, 2)
    expect(hargreavesSamani(minC, maxC, extraterrestrial)).toBeCloseTo(hargreaves, 2)
  })

  it('refuses reversed extremes and gaps', () => {
    expect(() => penmanMonteithDay({ ...uccle(), minC: 22 })).toThrow(RangeError)
    expect(() => penmanMonteithDay({ ...uccle(), wind2mMs: Number.NaN, vapourKpa: Number.NaN })).toThrow(RangeError)
    expect(() => hargreavesSamani(12, 3, 30)).toThrow(RangeError)
  })
})

describe('penmanMonteithHour', () => {
  it('gives 0.63 mm at N’Diaye between 14 and 15 h (FAO-56 example 19, p. 75; full figure 0.6269)', () => {
    const hour = {
      temperatureC: 38,
      vapourKpa: saturationVapourPressure(38) * 0.52,
      wind2mMs: 3.3,
      radiation: 2.450,
      clearness: 2.450 / 2.6581,
      daytime: true,
    }
    expect(netRadiationHour(hour)).toBeCloseTo(1.7492, 4)
    expect(penmanMonteithHour(hour, psychrometricConstant(airPressureKpa(8)))).toBeCloseTo(0.6269, 4)
  })
})

describe('hourlyReferenceEt', () => {
  const place = { latitudeDeg: 46.9, longitudeDeg: -96.8, elevationM: 270 }
  const day = (change: Partial<HourlyWeather> = {}): HourlyWeather => ({
    startsAt: Date.UTC(2025, 4, 5, 6) / 1000,
    hours: 24,
    rainMm: new Float64Array(24),
    temperatureC: Float64Array.from({ length: 24 }, (_, hour) => 10 - 6 * Math.cos((hour - 4) * Math.PI / 12)),
    humidityPct: new Float64Array(24).fill(60),
    windMs: new Float64Array(24).fill(4),
    radiationWm2: Float64Array.from({ length: 24 }, (_, hour) => Math.max(0, 750 * Math.sin((hour - 6) * Math.PI / 14))),
    ...change,
  })

  it('agrees with the daily method within a tenth on a clear spring day', () => {
    const weather = day()
    const sum = hourlyReferenceEt(weather, place).reduce((a, b) => a + b)
    const radiation = weather.radiationWm2.reduce((a, b) => a + b) * 3600 / 1e6
    const extraterrestrial = extraterrestrialDay(46.9, 125)
    const vapour = weather.temperatureC.reduce((total, t) => total + saturationVapourPressure(t) * 0.6, 0) / 24
    const daily = penmanMonteithDay({ minC: 4, maxC: 16, vapourKpa: vapour, wind2mMs: windAt2m(4, 10), radiation, clearSky: clearSkyRadiation(extraterrestrial, 270), elevationM: 270 })
    expect(Math.abs(sum / daily - 1)).toBeLessThan(0.1)
  })

  it('is least at night and never negative', () => {
    const et = hourlyReferenceEt(day(), place)
    expect(Math.min(...et)).toBeGreaterThanOrEqual(0)
    expect(et[14]!).toBeGreaterThan(5 * et[2]!)
  })

  // FAO-56 example 19 (p. 75): N’Diaye, 16°13' N 16.25° W, 14 to 15 h of UTC−1 on 1 October; wind 3.3 m/s at 2 m.
  it('gives 0.63 mm for the hour of example 19 from its UTC time and longitude (full figure 0.6269)', () => {
    const one = (value: number) => Float64Array.of(value)
    const hour: HourlyWeather = {
      startsAt: Date.UTC(2023, 9, 1, 15) / 1000, hours: 1, rainMm: one(0), temperatureC: one(38), humidityPct: one(52),
      windMs: one(3.3 / windAt2m(1, 10)), radiationWm2: one(2.450e6 / 3600),
    }
    const senegal = { latitudeDeg: 16 + 13 / 60, longitudeDeg: -16.25, elevationM: 8 }
    expect(hourlyReferenceEt(hour, senegal)[0]).toBeCloseTo(0.6269, 3)
    // With the sign of the longitude turned round the sun stands two hours off, and the sky counts as clear.
    expect(Math.abs(hourlyReferenceEt(hour, { ...senegal, longitudeDeg: 16.25 })[0]! - 0.6269)).toBeGreaterThan(0.003)
  })

  // FAO-56 p. 75: the night takes Rs/Rso of 2 to 3 hours before sunset. On 5 May at 46.9° N 96.8° W the sun sets at about
  // 01:45 UTC, so that hour is 23:00 UTC, index 17.
  describe('takes the cloudiness of the night from 2 to 3 hours before sunset', () => {
    const tonight = (changed: number | null) => {
      const hours = 28
      const fill = (value: (hour: number) => number) => Float64Array.from({ length: hours }, (_, hour) => value(hour))
      const radiationWm2 = fill(hour => Math.max(0, 750 * Math.sin((hour - 6) * Math.PI / 14)))
      if (changed !== null) radiationWm2[changed]! *= 0.2
      return hourlyReferenceEt({
        startsAt: Date.UTC(2025, 4, 5, 6) / 1000, hours, rainMm: fill(() => 0), temperatureC: fill(() => 12),
        humidityPct: fill(() => 40), windMs: fill(() => 5), radiationWm2,
      }, place)
    }
    const NIGHT = 23

    it('a cloud in that hour makes the night lose less', () => {
      expect(tonight(17)[NIGHT]!).toBeGreaterThan(tonight(null)[NIGHT]!)
    })

    it.each([13, 16, 18, 19])('a cloud in hour %s changes that hour and not the night', (hour) => {
      expect(tonight(hour)[hour]!).not.toBe(tonight(null)[hour]!)
      expect(tonight(hour)[NIGHT]!).toBe(tonight(null)[NIGHT]!)
    })
  })

  it.each(['temperatureC', 'humidityPct', 'windMs', 'radiationWm2'] as const)('names the hour of a gap in %s', (name) => {
    const values = day()[name]
    values[3] = Number.NaN
    expect(() => hourlyReferenceEt(day({ [name]: values }), place)).toThrow(RangeError)
    expect(() => hourlyReferenceEt(day({ [name]: values }), place)).toThrow(/2025-05-05T09:00/)
  })
})
