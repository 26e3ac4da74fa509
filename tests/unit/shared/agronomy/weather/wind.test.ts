import { describe, expect, it } from 'vitest'
import { windAt2m } from '../../../../../shared/agronomy/weather/wind'

describe('windAt2m', () => {
  it('brings 3.2 m/s at 10 m to 2.4 m/s (FAO-56 example 14, p. 56; full figure 2.3934)', () => {
    expect(windAt2m(3.2, 10)).toBeCloseTo(2.3934, 4)
  })

  it('refuses a height at which the equation has no meaning', () => {
    expect(() => windAt2m(3, 0.05)).toThrow(RangeError)
    expect(() => windAt2m(Number.NaN, 10)).toThrow(RangeError)
  })
})
