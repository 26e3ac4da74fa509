import { beforeEach, describe, expect, it } from 'vitest'
import { fieldSoil } from '../../../../../shared/agronomy/soil/field-soil'
import { startingState, type FieldState } from '../../../../../shared/agronomy/soil/field-state'
import { CARRIES, HELD, holdConditions, isFrozen, SEED_ZONE_FIT, SURFACE_DRY, TILLAGE_FIT } from '../../../../../shared/agronomy/soil/fit-rule'

const clay = fieldSoil({ sandPct: 25, clayPct: 50, organicMatterPct: 3 }, 'tiled', 0)
let state: FieldState

/** Ground that meets every condition. */
beforeEach(() => {
  state = startingState(clay, 8)
  state.water1Mm = 100 * clay.fitWater
  state.water2Mm = 200 * clay.belowFitWater
  state.surfaceDryMm = 5
})

function held(): number[] {
  return [SEED_ZONE_FIT, TILLAGE_FIT, CARRIES, SURFACE_DRY].map(condition => state.held[condition] === HELD ? 1 : 0)
}

function pass(...localHours: number[]): number[] {
  for (const hour of localHours) holdConditions(clay, hour, state)
  return held()
}

describe('holdConditions', () => {
  it('asks for two states in a row', () => {
    expect(pass(10)).toEqual([0, 0, 0, 0])
    expect(pass(11)).toEqual([1, 1, 1, 1])
  })

  it('lets nothing become fit before 8 or after 20 local time', () => {
    expect(pass(20, 21, 22, 23, 0, 1, 2, 3, 4, 5, 6, 7)).toEqual([0, 0, 0, 0])
    expect(pass(8)).toEqual([1, 1, 1, 1])
  })

  it('keeps what is fit through the night', () => {
    pass(18, 19)
    expect(pass(20, 23, 3, 6)).toEqual([1, 1, 1, 1])
  })

  it('loses it at once, and asks for two states again', () => {
    pass(10, 11)
    state.water1Mm = 100 * clay.fitWater + 0.01
    expect(pass(12)).toEqual([0, 0, 1, 1])
    state.water1Mm = 100 * clay.fitWater
    expect(pass(13)).toEqual([0, 0, 1, 1])
    expect(pass(14)).toEqual([1, 1, 1, 1])
  })

  it('keeps the tool out while the layer below is too wet, not the planter', () => {
    state.water2Mm = 200 * clay.belowFitWater + 0.01
    expect(pass(10, 11)).toEqual([1, 0, 1, 1])
  })

  it('keeps the roller off until the surface has dried', () => {
    state.surfaceDryMm = 2.9
    expect(pass(10, 11)).toEqual([1, 1, 1, 0])
  })

  it.each([
    ['snow', (s: FieldState) => { s.snowMm = 1 }],
    ['standing water', (s: FieldState) => { s.pondMm = 0.1 }],
    ['frost in the ground', (s: FieldState) => { s.frostIndex = 56 }],
    ['4 in at freezing', (s: FieldState) => { s.mean10C = 0 }],
  ])('lets nobody on with %s', (_, change) => {
    change(state)
    expect(pass(10, 11, 12)).toEqual([0, 0, 0, 0])
  })
})

describe('isFrozen', () => {
  it('is so from 56 °C·d, or at 0 °C at 4 in', () => {
    expect(isFrozen(55.9, 0.1)).toBe(false)
    expect(isFrozen(56, 0.1)).toBe(true)
    expect(isFrozen(0, 0)).toBe(true)
  })
})
