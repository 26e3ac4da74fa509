import { describe, expect, it } from 'vitest'
import { estimatedRadiation, estimatedReferenceEt } from '../../../../../shared/agronomy/weather/daily-estimate'
import { saturationVapourPressure } from '../../../../../shared/agronomy/weather/humidity'
import { clearSkyRadiation, extraterrestrialDay } from '../../../../../shared/agronomy/weather/radiation'
import { hargreavesSamani, penmanMonteithDay } from '../../../../../shared/agronomy/weather/reference-evapotranspiration'
import { windAt2m } from '../../../../../shared/agronomy/weather/wind'

const lyon = { latitudeDeg: 45 + 43 / 60, elevationM: 200, coastal: false }

describe('estimatedRadiation', () => {
  it('gives 22.3 MJ at Lyon in July (FAO-56 example 15, p. 61; full figure 22.290)', () => {
    expect(estimatedRadiation(14.8, 26.6, lyon, 196)).toBeCloseTo(22.290, 3)
  })

  it('gives 0.19/0.16 of that at a coast, at most a clear sky', () => {
    expect(estimatedRadiation(14.8, 26.6, { ...lyon, coastal: true }, 196) / 22.290).toBeCloseTo(0.19 / 0.16, 4)
    expect(estimatedRadiation(0, 40, lyon, 196)).toBe(clearSkyRadiation(extraterrestrialDay(lyon.latitudeDeg, 196), 200))
  })
})

describe('estimatedReferenceEt', () => {
  it('is eq 6 with air saturated at the minimum, and with 2 m/s where there is no wind', () => {
    const by = (wind2mMs: number) => penmanMonteithDay({
      minC: 14.8, maxC: 26.6, vapourKpa: saturationVapourPressure(14.8), wind2mMs, elevationM: 200,
      radiation: estimatedRadiation(14.8, 26.6, lyon, 196), clearSky: clearSkyRadiation(extraterrestrialDay(lyon.latitudeDeg, 196), 200),
    })
    expect(estimatedReferenceEt(14.8, 26.6, null, lyon, 196)).toBe(by(2))
    expect(estimatedReferenceEt(14.8, 26.6, 5, lyon, 196)).toBe(by(windAt2m(5, 10)))
  })

  // FAO-56 p. 64: Hargreaves–Samani underpredicts where u2 is above 3 m/s.
  it('is above Hargreaves–Samani on a windy, clear northern spring day', () => {
    const place = { latitudeDeg: 48, elevationM: 270, coastal: false }
    expect(estimatedReferenceEt(-3, 9, 6, place, 95)).toBeGreaterThan(hargreavesSamani(-3, 9, extraterrestrialDay(48, 95)))
  })

  it('is never negative, and refuses reversed extremes and gaps', () => {
    expect(estimatedReferenceEt(-30, -29, 0, { latitudeDeg: 48, elevationM: 270, coastal: false }, 1)).toBeGreaterThanOrEqual(0)
    expect(() => estimatedReferenceEt(10, 9, 3, lyon, 100)).toThrow(RangeError)
    expect(() => estimatedReferenceEt(Number.NaN, 9, 3, lyon, 100)).toThrow(RangeError)
    expect(() => estimatedReferenceEt(1, 9, Number.NaN, lyon, 100)).toThrow(RangeError)
    expect(() => estimatedRadiation(10, 9, lyon, 100)).toThrow(RangeError)
  })
})
