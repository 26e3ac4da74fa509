import { describe, expect, it } from 'vitest'
import { retentionMm, stormRunoffMm, wetCurveNumber } from '../../../../../shared/agronomy/soil/curve-number'
import { antecedentCurveNumber, beginStorm, isStormOver, noStorm, stormHourRunoffMm } from '../../../../../shared/agronomy/soil/storm'

describe('stormHourRunoffMm', () => {
  it('adds up to the runoff of the whole storm, not to that of its hours one by one', () => {
    const storm = noStorm()
    beginStorm(storm, 85)
    let sum = 0
    for (let hour = 0; hour < 6; hour++) sum += stormHourRunoffMm(storm, 25.4 / 6)
    expect(sum).toBeCloseTo(4.41, 2) // 25.4 mm on curve number 85, TR-55 eq. 2-3
    expect(6 * stormRunoffMm(25.4 / 6, retentionMm(85))).toBe(0)
  })

  it('is over after twelve hours without water', () => {
    const storm = noStorm()
    expect(isStormOver(storm)).toBe(true)
    beginStorm(storm, 85)
    stormHourRunoffMm(storm, 5)
    storm.dryHours = 11
    expect(isStormOver(storm)).toBe(false)
    storm.dryHours = 12
    expect(isStormOver(storm)).toBe(true)
  })
})

describe('antecedentCurveNumber', () => {
  const full = 0.501 / 0.42

  it('is condition II at the fit level and at field capacity', () => {
    expect(antecedentCurveNumber(85, 0.9, full, 0)).toBe(85)
    expect(antecedentCurveNumber(85, 1, full, 0)).toBe(85)
  })

  // Chow et al. (1988): 91 becomes 80.9 when dry and 95.9 when wet.
  it('is condition I on dry ground and III on full ground', () => {
    expect(antecedentCurveNumber(91, 0.5, full, 0)).toBeCloseTo(80.9, 1)
    expect(antecedentCurveNumber(91, full, full, 0)).toBeCloseTo(95.9, 1)
  })

  it('never falls as the ground gets wetter', () => {
    let before = 0
    for (let wetness = 0.3; wetness < full; wetness += 0.01) {
      const now = antecedentCurveNumber(85, wetness, full, 0)
      expect(now).toBeGreaterThanOrEqual(before)
      before = now
    }
  })

  // SWB2 blend, recomputed: CN 86, CN III 93.5, index 70 gives 89.89. Chow's CN III of 86 is 93.39, hence 0.06 less.
  it('blends towards condition III as the ground is frozen', () => {
    expect(antecedentCurveNumber(86, 0.9, full, 70)).toBeCloseTo(89.89, 0)
    expect(antecedentCurveNumber(86, 0.9, full, 70)).toBeCloseTo(86 * (1 - 14 / 27) + wetCurveNumber(86) * 14 / 27, 10)
    expect(antecedentCurveNumber(86, 0.9, full, 120)).toBe(wetCurveNumber(86))
  })
})
