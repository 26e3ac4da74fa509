import { beforeEach, describe, expect, it } from 'vitest'
import { fieldSoil } from '../../../../../shared/agronomy/soil/field-soil'
import { startingState, type FieldState } from '../../../../../shared/agronomy/soil/field-state'
import { advanceWater } from '../../../../../shared/agronomy/soil/water-hour'

const clay = fieldSoil({ sandPct: 25, clayPct: 50, organicMatterPct: 3 }, 'tiled', 0)
let state: FieldState

beforeEach(() => {
  state = startingState(clay, 8)
})

describe('advanceWater', () => {
  it('keeps snow on the ground in frost and melts it by the degree hour', () => {
    advanceWater(clay, 12, -5, 0, state)
    expect(state.snowMm).toBe(12)
    advanceWater(clay, 0, 4, 0, state)
    expect(12 - state.snowMm).toBeCloseTo(3.5 * 4 / 24, 10)
  })

  it('lets nothing evaporate under snow', () => {
    state.snowMm = 30
    advanceWater(clay, 0, -3, 0.4, state)
    expect(state.total.evaporatedMm).toBe(0)
  })

  it('lets rain fall through the snow to the ground', () => {
    state.snowMm = 30
    state.water1Mm = 35
    advanceWater(clay, 3, 2, 0, state)
    expect(state.snowMm).toBeLessThan(30)
    expect(state.water1Mm).toBeGreaterThan(37)
  })

  it('lets nothing soak into frozen ground: it stands, then runs off', () => {
    state.frostIndex = 120
    const { water1Mm, water2Mm, water3Mm } = state
    advanceWater({ ...clay, runoffShare: 0 }, 40, 3, 0, state)
    expect([state.water1Mm, state.water2Mm, state.water3Mm]).toEqual([water1Mm, water2Mm, water3Mm])
    expect(state.pondMm).toBe(clay.surfaceStorageMm)
    expect(state.pondMm + state.total.runoffMm).toBeCloseTo(40, 10)
    expect(state.total.drainedMm).toBe(0)
  })

  it('shuts only the top while 4 in is at freezing and the frost is not deep', () => {
    state.mean10C = -0.5
    state.water2Mm = 200 * clay.properties.saturation
    const { water1Mm } = state
    advanceWater(clay, 4, 3, 0, state)
    expect(state.water1Mm).toBe(water1Mm)
    expect(state.total.drainedMm).toBeGreaterThan(0)
  })

  it('takes evaporation from standing water first', () => {
    state.water1Mm = 100 * clay.properties.saturation
    state.water2Mm = 200 * clay.properties.saturation
    state.water3Mm = 300 * clay.subsoil.saturation
    state.pondMm = 5
    const bottom = { ...clay, bottomMmPerDay: 0 }
    advanceWater(bottom, 0, 15, 0.5, state)
    expect(state.pondMm).toBeCloseTo(5 - 0.55, 10)
    expect(state.water1Mm).toBeCloseTo(100 * clay.properties.saturation, 10)
  })

  it('never dries the top below what can evaporate from it, without rise from below', () => {
    const sealed = { ...clay, capillaryPerHour: 0, bottomMmPerDay: 0 }
    for (let hour = 0; hour < 24 * 200; hour++) advanceWater(sealed, 0, 20, 0.5, state)
    expect(state.water1Mm).toBeGreaterThanOrEqual(100 * clay.properties.fieldCapacity - clay.totalEvaporableMm - 1e-9)
    expect(state.water1Mm).toBeCloseTo(100 * 0.5 * clay.properties.wiltingPoint, 1)
  })

  it('lets no more out below than the drainage takes', () => {
    state.water3Mm = 300 * clay.subsoil.saturation
    advanceWater({ ...clay, bottomMmPerDay: 0.5 }, 0, 10, 0, state)
    expect(state.total.drainedMm).toBeCloseTo(0.5 / 24, 12)
  })

  it('counts how dry the surface has become since it was last wetted', () => {
    for (let hour = 0; hour < 10; hour++) advanceWater(clay, 0, 15, 0.4, state)
    expect(state.surfaceDryMm).toBeCloseTo(4.4, 10)
    advanceWater(clay, 3, 15, 0, state)
    expect(state.surfaceDryMm).toBeCloseTo(1.4, 10)
    advanceWater(clay, 3, 15, 0, state)
    expect(state.surfaceDryMm).toBe(0)
  })
})
