import { describe, expect, it } from 'vitest'
import {
  airPressureKpa, dailySaturationVapourPressure, psychrometricConstant, saturationVapourPressure, vapourPressureFromExtremes,
  vapourPressureFromHighestHumidity, vapourPressureFromMeanHumidity, vapourPressureFromWetBulb, vapourPressureSlope,
} from '../../../../../shared/agronomy/weather/humidity'

// Published figures: FAO-56 worked examples, by number and page. Full-precision figures recomputed from its equations.
describe('FAO-56 humidity', () => {
  it('gives pressure and psychrometric constant at 1,800 m (example 2, p. 32: 81.8 kPa, 0.054 kPa/°C)', () => {
    expect(airPressureKpa(1800)).toBeCloseTo(81.76, 2)
    expect(psychrometricConstant(airPressureKpa(1800))).toBeCloseTo(0.0544, 4)
  })

  it('averages the saturation pressure of the extremes (example 3, p. 36: 3.075, 1.705, 2.39)', () => {
    expect(saturationVapourPressure(24.5)).toBeCloseTo(3.075, 3)
    expect(saturationVapourPressure(15)).toBeCloseTo(1.705, 3)
    expect(dailySaturationVapourPressure(15, 24.5)).toBeCloseTo(2.390, 3)
  })

  it('is not the saturation pressure of the mean, which is lower (example 3: e°(19.75) is 2.30)', () => {
    expect(saturationVapourPressure(19.75)).toBeCloseTo(2.302, 3)
    expect(dailySaturationVapourPressure(15, 24.5)).toBeGreaterThan(saturationVapourPressure(19.75))
  })

  it('reads a psychrometer (example 4, p. 38: 1.91 kPa)', () => {
    expect(airPressureKpa(1200)).toBeCloseTo(87.90, 2)
    expect(vapourPressureFromWetBulb(25.6, 19.5, airPressureKpa(1200), 0.000662)).toBeCloseTo(1.912, 3)
  })

  it('pairs humidities crosswise with temperatures (example 5, p. 39: 1.70 and 1.78; eq 18: 1.692)', () => {
    expect(vapourPressureFromExtremes(18, 25, 54, 82)).toBeCloseTo(1.702, 3)
    expect(vapourPressureFromMeanHumidity(18, 25, 68)).toBeCloseTo(1.779, 3)
    expect(vapourPressureFromHighestHumidity(18, 82)).toBeCloseTo(1.692, 3)
  })

  it('gives the slope of example 18 (p. 72: 0.122 kPa/°C at 16.9 °C)', () => {
    expect(vapourPressureSlope(16.9)).toBeCloseTo(0.1221, 4)
  })

  it('refuses a wet bulb above the dry one and an impossible height', () => {
    expect(() => vapourPressureFromWetBulb(10, 11, 100, 0.000662)).toThrow(RangeError)
    expect(() => vapourPressureFromWetBulb(10, Number.NaN, 100, 0.000662)).toThrow(RangeError)
    expect(() => airPressureKpa(20_000)).toThrow(RangeError)
  })
})
