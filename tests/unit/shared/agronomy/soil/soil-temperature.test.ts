import { describe, expect, it } from 'vitest'
import { dampingDepthM, DEPTH_2_IN_M, DEPTH_4_IN_M, DIFFUSIVITY_M2_S, RATE_BARE, RATE_SNOW, soilMeanC, swingByHour, swingLagHours, swingShare } from '../../../../../shared/agronomy/soil/soil-temperature'

describe('soilMeanC', () => {
  // Zheng, Hunt & Running (1993), recomputed: bare ground from 3.0 °C.
  it('follows the air by the published daily step', () => {
    let soil = 3
    const means = [6, 8, 12, 5].map(air => soil = soilMeanC(soil, air, RATE_BARE))
    for (const [day, expected] of [3.75, 4.8125, 6.6094, 6.2070].entries()) expect(means[day]).toBeCloseTo(expected, 4)
  })

  it('comes to the same by the hour', () => {
    let soil = 3
    for (const air of [6, 8, 12, 5]) for (let hour = 0; hour < 24; hour++) soil = soilMeanC(soil, air, RATE_BARE, 1)
    expect(soil).toBeCloseTo(6.2070, 4)
  })

  // Time constant −1/ln(1 − M), recomputed.
  it.each([[RATE_BARE, 3.48], [RATE_SNOW, 9.49]])('with M %s is 1/e off after %s days', (rate, days) => {
    expect(soilMeanC(1, 0, rate, days * 24)).toBeCloseTo(Math.exp(-1), 3)
  })

  // Lag behind a ramp of 0.25 °C/d, recomputed.
  it.each([[RATE_BARE, 0.75], [RATE_SNOW, 2.25]])('with M %s trails a spring ramp by %s °C', (rate, lag) => {
    let soil = 0
    for (let day = 1; day <= 200; day++) soil = soilMeanC(soil, 0.25 * day, rate)
    expect(0.25 * 200 - soil).toBeCloseTo(lag, 6)
  })
})

describe('damping with depth', () => {
  const damping = dampingDepthM(DIFFUSIVITY_M2_S)

  // Hillel (1982), recomputed for D = 5e-7 m²/s.
  it('is 0.1173 m', () => {
    expect(damping).toBeCloseTo(0.1173, 4)
  })

  it.each([[2, DEPTH_2_IN_M, 0.648, 1.65], [4, DEPTH_4_IN_M, 0.420, 3.31]])('at %s in', (_, depth, share, lag) => {
    expect(swingShare(depth, damping)).toBeCloseTo(share, 3)
    expect(swingLagHours(depth, damping)).toBeCloseTo(lag, 2)
  })

  // Mean 6.0 °C, air 3 to 15 °C, wet surface, recomputed.
  it.each([[DEPTH_2_IN_M, 2.11, 9.89], [DEPTH_4_IN_M, 3.48, 8.52]])('at %s m swings from %s to %s °C', (depth, low, high) => {
    const swing = 6 * swingShare(depth, damping)
    expect(6 - swing).toBeCloseTo(low, 2)
    expect(6 + swing).toBeCloseTo(high, 2)
  })

  it('refuses a diffusivity that is none', () => {
    expect(() => dampingDepthM(0)).toThrow(RangeError)
    expect(() => dampingDepthM(Number.NaN)).toThrow(RangeError)
  })
})

describe('swingByHour', () => {
  const warmestHour = (depth: number) => {
    const swing = swingByHour(depth)
    return swing.indexOf(Math.max(...swing))
  }

  it('is warmest in the afternoon, later and less the deeper', () => {
    expect(warmestHour(0)).toBe(14)
    expect(warmestHour(DEPTH_2_IN_M)).toBe(16)
    expect(warmestHour(DEPTH_4_IN_M)).toBe(17)
    expect(Math.max(...swingByHour(DEPTH_4_IN_M))).toBeLessThan(Math.max(...swingByHour(DEPTH_2_IN_M)))
  })

  it('adds up to nothing over a day', () => {
    expect(swingByHour(DEPTH_2_IN_M).reduce((sum, share) => sum + share, 0)).toBeCloseTo(0, 10)
  })
})
