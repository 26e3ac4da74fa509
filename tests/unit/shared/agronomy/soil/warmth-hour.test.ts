import { describe, expect, it } from 'vitest'
import { fieldSoil } from '../../../../../shared/agronomy/soil/field-soil'
import { startingState } from '../../../../../shared/agronomy/soil/field-state'
import { advanceWarmth, beginDay, rememberSeedZone, surfaceHalfRangeC, temperature2InC, temperature4InC } from '../../../../../shared/agronomy/soil/warmth-hour'

const clay = fieldSoil({ sandPct: 25, clayPct: 50, organicMatterPct: 3 }, 'tiled', 0)
const hoursOfDay = (hours: number, from = 0) => Uint8Array.from({ length: hours }, (_, hour) => (from + hour) % 24)

describe('beginDay', () => {
  it('looks ahead to local midnight for the range of the day', () => {
    const state = startingState(clay, 5)
    const air = Float64Array.from({ length: 48 }, (_, hour) => hour < 24 ? (hour === 5 ? 3 : hour === 15 ? 15 : 9) : 40)
    expect(beginDay(air, hoursOfDay(48), 0, state)).toBe(24)
    expect(state.day.halfRangeC).toBe(6)
  })

  it('starts soil temperature at the mean of the first day when it is not known', () => {
    const state = startingState(clay)
    beginDay(Float64Array.from({ length: 24 }, (_, hour) => hour), hoursOfDay(24), 0, state)
    expect(state.mean5C).toBeCloseTo(11.5, 10)
    expect(state.mean10C).toBeCloseTo(11.5, 10)
  })

  it('keeps the range of the day before while most of the day is not known', () => {
    const state = startingState(clay, 5)
    state.day.halfRangeC = 7
    beginDay(new Float64Array(4).fill(9), hoursOfDay(4), 0, state)
    expect(state.day.halfRangeC).toBe(7)
  })

  // Molnau & Bissell (1983): from 0 at a mean of −10 °C the index goes to 10.
  it('moves the frost index by the day that is over', () => {
    const state = startingState(clay, -1)
    const air = new Float64Array(48).fill(-10)
    const localHour = hoursOfDay(48)
    for (let hour = 0, next = 0; hour < 48; hour++) {
      if (hour === next) next = beginDay(air, localHour, hour, state)
      advanceWarmth(air[hour]!, localHour[hour]!, state)
    }
    expect(state.frostIndex).toBeCloseTo(10, 10)
  })

  it('takes a day of 23 or 25 hours as one', () => {
    for (const skipped of [[0, 1, 3, 4], [0, 1, 1, 2, 3]]) {
      const localHour = Uint8Array.from([...skipped, ...Array.from({ length: 24 - 1 - skipped.at(-1)! }, (_, index) => skipped.at(-1)! + 1 + index), 0, 1])
      const state = startingState(clay, 5)
      expect(beginDay(new Float64Array(localHour.length), localHour, 0, state)).toBe(localHour.length - 2)
    }
  })
})

describe('advanceWarmth', () => {
  // Zheng, Hunt & Running (1993), recomputed: 4 in bare, from 3.0 with daily air means 6, 8, 12, 5 °C.
  it('gives the published daily means at 4 in', () => {
    const state = startingState(clay, 3)
    const means = [6, 8, 12, 5].map((air) => {
      for (let hour = 0; hour < 24; hour++) advanceWarmth(air, hour, state)
      return state.mean10C
    })
    for (const [day, expected] of [3.75, 4.8125, 6.6094, 6.2070].entries()) expect(means[day]).toBeCloseTo(expected, 4)
    expect(state.mean5C).not.toBeCloseTo(state.mean10C, 1)
  })

  it('follows slowly under snow', () => {
    const state = startingState(clay, 0)
    state.snowMm = 20
    for (let hour = 0; hour < 24; hour++) advanceWarmth(-10, hour, state)
    expect(state.mean10C).toBeCloseTo(-1, 10)
  })

  it('stays at 0 °C at most while the ground thaws', () => {
    const state = startingState(clay, -2)
    state.frostIndex = 100
    for (let hour = 0; hour < 240; hour++) advanceWarmth(12, hour % 24, state)
    expect(state.mean10C).toBe(0)
  })
})

describe('surfaceHalfRangeC and the temperatures at depth', () => {
  const state = startingState(clay, 6)
  state.day.halfRangeC = 6

  // Mean 6.0 °C, air 3 to 15 °C, wet surface, D 5e-7 m²/s, recomputed: 2.11 to 9.89 at 2 in, 3.48 to 8.52 at 4 in. By
  // the middle of each hour the extremes are met to 0.1 °C.
  it('swing by the day', () => {
    const wet = surfaceHalfRangeC(clay, state)
    const at = (temperature: typeof temperature2InC) => Array.from({ length: 24 }, (_, hour) => temperature(state, wet, hour))
    expect(Math.min(...at(temperature2InC))).toBeCloseTo(2.11, 1)
    expect(Math.max(...at(temperature2InC))).toBeCloseTo(9.89, 1)
    expect(Math.abs(Math.min(...at(temperature4InC)) - 3.48)).toBeLessThan(0.1)
    expect(Math.abs(Math.max(...at(temperature4InC)) - 8.52)).toBeLessThan(0.1)
  })

  it('swing more on a dry surface, less under residue, not at all under snow or in frost', () => {
    expect(surfaceHalfRangeC(clay, state)).toBe(6)
    expect(surfaceHalfRangeC(clay, { ...state, water1Mm: 30 })).toBeCloseTo(7.8, 10)
    expect(surfaceHalfRangeC({ ...clay, residuePct: 60 }, state)).toBeCloseTo(4.2, 10)
    expect(surfaceHalfRangeC(clay, { ...state, snowMm: 6 })).toBe(0)
    expect(surfaceHalfRangeC(clay, { ...state, frostIndex: 90 })).toBe(0)
  })
})

describe('rememberSeedZone', () => {
  it('gives the mean of the last 72 hours, of fewer while there are fewer', () => {
    const { seed } = startingState(clay, 6)
    expect(rememberSeedZone(seed, 4)).toBe(4)
    expect(rememberSeedZone(seed, 8)).toBe(6)
    const all = [4, 8]
    for (let hour = 2; hour < 500; hour++) {
      all.push(10 * Math.sin(hour / 5))
      const last = all.slice(-72)
      expect(rememberSeedZone(seed, all.at(-1)!)).toBeCloseTo(last.reduce((sum, value) => sum + value, 0) / last.length, 10)
    }
  })
})
