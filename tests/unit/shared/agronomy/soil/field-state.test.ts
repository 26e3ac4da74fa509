import { describe, expect, it } from 'vitest'
import { fieldSoil } from '../../../../../shared/agronomy/soil/field-soil'
import { balanceErrorMm, copyState, startingState, storedMm } from '../../../../../shared/agronomy/soil/field-state'
import { createTrace, runFieldModel } from '../../../../../shared/agronomy/soil/water-balance'
import { evenWeather } from './even-weather'

const clay = fieldSoil({ sandPct: 25, clayPct: 50, organicMatterPct: 3 }, 'tiled', 0)

describe('startingState', () => {
  it('is drained to field capacity, bare and unfrozen', () => {
    const state = startingState(clay)
    expect(state.water1Mm + state.water2Mm).toBeCloseTo(300 * clay.properties.fieldCapacity, 10)
    expect(storedMm(state)).toBeCloseTo(300 * clay.properties.fieldCapacity + 300 * clay.subsoil.fieldCapacity, 10)
    expect([state.snowMm, state.pondMm, state.frostIndex]).toEqual([0, 0, 0])
  })
})

describe('copyState', () => {
  it('copies everything and shares nothing', () => {
    const input = evenWeather(200, 5, hour => hour % 31 === 0 ? 12 : 0, hour => 4 * Math.sin(hour / 9), 2)
    const from = startingState(clay)
    runFieldModel(clay, input.weather, input.etoMm, input.localHour, from, createTrace(200))
    const to = startingState(clay)
    copyState(from, to)
    expect(to).toEqual(from)
    const kept = structuredClone(to)
    runFieldModel(clay, input.weather, input.etoMm, input.localHour, from, createTrace(200))
    expect(to).toEqual(kept)
  })
})

describe('balanceErrorMm', () => {
  it('finds water that comes from nowhere', () => {
    const before = startingState(clay)
    const after = startingState(clay)
    expect(balanceErrorMm(before, after)).toBe(0)
    after.water2Mm += 0.5
    expect(balanceErrorMm(before, after)).toBeCloseTo(0.5, 10)
    after.total.inMm += 0.5
    expect(balanceErrorMm(before, after)).toBeCloseTo(0, 10)
    after.water1Mm -= 0.2
    after.total.evaporatedMm += 0.2
    expect(balanceErrorMm(before, after)).toBeCloseTo(0, 10)
  })
})
