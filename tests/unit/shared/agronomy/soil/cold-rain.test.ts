import { describe, expect, it } from 'vitest'
import { holdForColdRain } from '../../../../../shared/agronomy/soil/cold-rain'

const celsius = (fahrenheit: number) => (fahrenheit - 32) / 1.8

/** Whether planting at hour 0 must wait: soil at 52 °F but for one hour, rain in one hour. */
function holds(chillHours: number, lowF: number, lowAt: number, rainIn: number, rainAt: number): boolean {
  const temperature = new Float64Array(72).fill(celsius(52))
  temperature[lowAt] = celsius(lowF)
  const rain = new Float64Array(72)
  rain[rainAt] = rainIn * 25.4
  const plant = new Uint8Array(72).fill(1)
  const cold = new Uint8Array(72)
  holdForColdRain(temperature, rain, 72, chillHours, plant, cold)
  expect(plant[0]! + cold[0]!).toBe(1)
  return cold[0] === 1
}

describe('holdForColdRain', () => {
  // Extension rules on chilling of swallowing seed: 48 h for corn, 24 h for soybean, 45 °F.
  it('holds corn when 43 °F and 0.6 in come within 48 h', () => {
    expect(holds(48, 43, 30, 0.6, 20)).toBe(true)
  })

  it('lets soybean go when the low comes at hour 30, after its 24 h', () => {
    expect(holds(24, 43, 30, 0.6, 20)).toBe(false)
  })

  it('lets corn go without the rain, with too little of it, or with soil at 46 °F', () => {
    expect(holds(48, 43, 30, 0, 20)).toBe(false)
    expect(holds(48, 43, 30, 0.09, 20)).toBe(false)
    expect(holds(48, 46, 30, 0.6, 20)).toBe(false)
    expect(holds(48, 43, 30, 0.1, 20)).toBe(true)
  })

  it('counts exactly the hours of danger', () => {
    expect(holds(48, 43, 47, 0.6, 47)).toBe(true)
    expect(holds(48, 43, 48, 0.6, 20)).toBe(false)
    expect(holds(48, 43, 20, 0.6, 48)).toBe(false)
  })

  it('leaves crops without the rule alone, and hours that were shut anyway', () => {
    expect(holds(0, 43, 3, 0.6, 3)).toBe(false)
    const plant = new Uint8Array(1)
    const cold = new Uint8Array(1)
    holdForColdRain(Float64Array.of(2), Float64Array.of(20), 1, 48, plant, cold)
    expect([plant[0], cold[0]]).toEqual([0, 0])
  })
})
