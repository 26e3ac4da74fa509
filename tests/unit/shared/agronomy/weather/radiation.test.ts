import { describe, expect, it } from 'vitest'
import { saturationVapourPressure } from '../../../../../shared/agronomy/weather/humidity'
import {
  clearSkyRadiation, daylightHours, declination, extraterrestrialDay, extraterrestrialHour, hourAngle, inverseSunDistance, netLongwaveDay,
  netLongwaveHour, netShortwave, radiationFromSunshine, radiationFromTemperatures, seasonalCorrection, sunsetHourAngle,
} from '../../../../../shared/agronomy/weather/radiation'

// Published figures: FAO-56 worked examples; the digits beyond the printed ones are recomputed from its equations.
describe('FAO-56 radiation', () => {
  it('example 8, p. 47: 20° S on 3 September (J 246)', () => {
    expect(inverseSunDistance(246)).toBeCloseTo(0.9848, 4)
    expect(declination(246)).toBeCloseTo(0.1197, 4)
    expect(sunsetHourAngle(-20, 246)).toBeCloseTo(1.5270, 4)
    expect(extraterrestrialDay(-20, 246)).toBeCloseTo(32.194, 3)
  })

  it('example 9, p. 49: daylight of the same day, 11.7 h', () => {
    expect(daylightHours(-20, 246)).toBeCloseTo(11.666, 3)
  })

  it('example 10, p. 50: Rio de Janeiro in May, 25.1 and 14.5 MJ', () => {
    expect(extraterrestrialDay(-22.9, 135)).toBeCloseTo(25.111, 3)
    expect(radiationFromSunshine(220 / 31, daylightHours(-22.9, 135), extraterrestrialDay(-22.9, 135))).toBeCloseTo(14.456, 3)
  })

  it('examples 11 and 12, pp. 52 and 53: net longwave 3.5, net shortwave 11.1, net 7.6', () => {
    const clearSky = clearSkyRadiation(25.111, 0)
    expect(clearSky).toBeCloseTo(18.833, 3)
    const longwave = netLongwaveDay(19.1, 25.1, 2.1, 14.456 / clearSky)
    expect(longwave).toBeCloseTo(3.509, 3)
    expect(netShortwave(14.456)).toBeCloseTo(11.131, 3)
    expect(netShortwave(14.456) - longwave).toBeCloseTo(7.623, 3)
  })

  it('example 15, p. 61: Lyon in July from temperatures, 40.6 and 22.3 MJ', () => {
    const extraterrestrial = extraterrestrialDay(45 + 43 / 60, 196)
    expect(extraterrestrial).toBeCloseTo(40.555, 3)
    expect(radiationFromTemperatures(14.8, 26.6, extraterrestrial, 0.16, clearSkyRadiation(extraterrestrial, 200))).toBeCloseTo(22.290, 3)
  })

  it('example 19, p. 75: an hour at N’Diaye', () => {
    const latitude = 16 + 13 / 60
    expect(seasonalCorrection(274)).toBeCloseTo(0.1889, 4)
    const angle = hourAngle(14.5, 15, 16.25, 274)
    expect(angle).toBeCloseTo(0.6821, 4)
    const extraterrestrial = extraterrestrialHour(latitude, 274, angle)
    expect(extraterrestrial).toBeCloseTo(3.5434, 3)
    expect(clearSkyRadiation(extraterrestrial, 8)).toBeCloseTo(2.6581, 3)
    expect(netLongwaveHour(38, 0.52 * saturationVapourPressure(38), 2.450 / 2.6581)).toBeCloseTo(0.1373, 4)
  })

  it('has no sun at night, and the hours of a day add up to the day', () => {
    expect(extraterrestrialHour(47, 115, hourAngle(0.5, 0, 0, 115))).toBe(0)
    let sum = 0
    for (let hour = 0; hour < 24; hour++) sum += extraterrestrialHour(47, 115, hourAngle(hour + 0.5, 0, 0, 115))
    expect(sum / extraterrestrialDay(47, 115)).toBeCloseTo(1, 3)
  })

  it('caps the cloudiness quotient at 1 and refuses a latitude that is none', () => {
    expect(netLongwaveDay(5, 15, 1, 1.4)).toBe(netLongwaveDay(5, 15, 1, 1))
    expect(() => extraterrestrialDay(100, 10)).toThrow(RangeError)
  })
})
