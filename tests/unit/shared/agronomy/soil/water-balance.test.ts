import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { fieldSoil, type FieldSoil } from '../../../../../shared/agronomy/soil/field-soil'
import { createFitMarks, markFitHours, type FitMarks } from '../../../../../shared/agronomy/soil/fit'
import { balanceErrorMm, copyState, createTrace, runFieldModel, startingState, storedMm, type FieldState } from '../../../../../shared/agronomy/soil/water-balance'
import { evenWeather, part, type SoilInput } from './even-weather'

const CLAY = { sandPct: 25, clayPct: 50, organicMatterPct: 3 }

/** The clay of the reference trace: one soil in all layers, Kc 1.15, c 0.01/h, curve number 85. */
function referenceClay(): FieldSoil {
  const soil = fieldSoil(CLAY, 'tiled', 0)
  return { ...soil, subsoil: soil.properties, capillaryPerHour: 0.01, cropCoefficient: 1.15, curveNumber: 85 }
}

/** Top layer at the fit level, the others at field capacity. */
function justFit(soil: FieldSoil): FieldState {
  const state = startingState(soil, 12)
  state.water1Mm = 100 * soil.fitWater
  return state
}

function run(soil: FieldSoil, input: SoilInput, state: FieldState) {
  const trace = createTrace(input.weather.hours)
  runFieldModel(soil, input.weather, input.etoMm, input.localHour, state, trace)
  const marks = createFitMarks(input.weather.hours)
  markFitHours(soil, trace, input.localHour, 0, marks)
  return { trace, marks }
}

const RAIN_HOURS = 6
/** Hours from the end of the rain to the first fit one. */
const hoursToFit = (marks: FitMarks) => marks.dig.indexOf(1, RAIN_HOURS) - RAIN_HOURS

describe('runFieldModel against the reference trace', () => {
  // Soil model reference, section 11.6: 25.4 mm from 18:00 to midnight, ETo 3 mm/d.
  it('takes the reference clay’s properties', () => {
    const { properties, totalEvaporableMm, readilyEvaporableMm } = referenceClay()
    expect(properties.saturatedConductivityMmH).toBeCloseTo(1.288, 3)
    expect(properties.conductivityExponent).toBeCloseTo(25.348, 3)
    expect(properties.fieldCapacity).toBeCloseTo(0.4198, 4)
    expect(properties.saturation).toBeCloseTo(0.5009, 4)
    expect(properties.wiltingPoint).toBeCloseTo(0.2983, 4)
    expect([totalEvaporableMm.toFixed(2), readilyEvaporableMm]).toEqual(['27.06', 10])
  })

  // The reference run took its runoff, 4.41 mm, evenly from the rain.
  it('gives its water at 6, 12 and 24 h, and is fit 65 h after the rain', () => {
    const soil = { ...referenceClay(), runoffShare: 0 }
    const { trace, marks } = run(soil, evenWeather(96, 18, hour => hour < RAIN_HOURS ? (25.4 - 4.4095) / RAIN_HOURS : 0, () => 12, 3), justFit(soil))
    expect([6, 12, 24].map(hour => trace.water1[hour - 1]!.toFixed(4))).toEqual(['0.4910', '0.4910', '0.4343'])
    expect([6, 12, 24].map(hour => trace.water2[hour - 1]!.toFixed(4))).toEqual(['0.4366', '0.4638', '0.4635'])
    expect(hoursToFit(marks)).toBe(65)
  })

  it('takes the same 4.41 mm by storm, and is fit at the same hour', () => {
    const soil = referenceClay()
    const state = justFit(soil)
    const { marks } = run(soil, evenWeather(96, 18, hour => hour < RAIN_HOURS ? 25.4 / RAIN_HOURS : 0, () => 12, 3), state)
    expect(state.total.runoffMm).toBeCloseTo(4.41, 2)
    expect(hoursToFit(marks)).toBe(65)
  })

  it('rises at night by capillarity', () => {
    const soil = referenceClay()
    const { trace } = run(soil, evenWeather(48, 18, () => 0, () => 12, 3), justFit(soil))
    expect(trace.water1[11]!).toBeGreaterThan(trace.water1[0]!)
  })
})

describe('days to fit after rain', () => {
  // Soil model reference, section 8.5: days after 0.5, 1 and 2 in at c 0.01/h, then at 0.03/h; runoff by row crop, straight
  // row with residue (group D 85, C 82, B 75). Printed to 0.1 d, so the tolerance is half of that.
  const TABLE = [
    ['clay', 25, 50, 3, 85, [[3.7, 4.6, 5.5, 5.7, 7.7, 9.6], [2.5, 2.7, 3.5, 3.5, 4.6, 5.6], [1.6, 1.7, 2.5, 1.7, 2.6, 3.5]]],
    ['silty clay', 5, 50, 4.5, 85, [[4.6, 5.6, 6.5, 6.6, 9.6, 12.6], [2.7, 3.6, 3.7, 3.6, 5.6, 6.6], [1.7, 2.5, 2.5, 2.5, 2.7, 3.6]]],
    ['clay loam', 30, 35, 4, 82, [[3.5, 3.6, 3.7, 4.5, 5.7, 7.6], [2.5, 2.5, 2.6, 2.6, 3.6, 3.8], [1.5, 1.6, 1.6, 1.6, 2.5, 2.6]]],
    ['loam', 40, 20, 3, 75, [[2.5, 2.7, 3.5, 3.5, 4.6, 5.6], [1.7, 2.5, 2.5, 2.5, 2.7, 3.6], [1.5, 1.5, 1.6, 1.5, 1.7, 2.5]]],
    ['silt loam', 20, 15, 3, 75, [[0.9, 1.3, 1.3, 1.4, 1.5, 1.5], [0.7, 0.8, 0.8, 0.7, 1.4, 1.5], [0.6, 0.6, 0.6, 0.6, 0.7, 0.7]]],
  ] as const
  const ETO = [2, 3, 4.5]
  const PRINTED_TO = 0.0501
  /**
   * Residuals: here a night lies between the printed day and ours. The clay loam is under its level for one hourly state
   * before dusk, by 0.00006, where we ask for two; the silt loam gets under it after 20:00, where we let nothing become
   * fit before morning. The reference counted both.
   */
  const A_NIGHT_LATER = new Set(['clay loam 3 0.03 50.8', 'silt loam 2 0.01 12.7'])

  it.each(TABLE)('%s', (name, sandPct, clayPct, organicMatterPct, curveNumber, rows) => {
    const base = fieldSoil({ sandPct, clayPct, organicMatterPct }, 'tiled', 0)
    for (const [line, eto] of ETO.entries()) {
      for (const [column, printed] of rows[line]!.entries()) {
        const rainMm = [12.7, 25.4, 50.8][column % 3]!
        const c = column < 3 ? 0.01 : 0.03
        const soil = { ...base, subsoil: base.properties, curveNumber, capillaryPerHour: c, cropCoefficient: 1.15 }
        const kept = rainMm - runoffOf(soil, rainMm)
        const { marks } = run({ ...soil, runoffShare: 0 }, evenWeather(24 * 20, 18, hour => hour < RAIN_HOURS ? kept / RAIN_HOURS : 0, () => 12, eto), justFit(soil))
        const days = (marks.rocks.indexOf(1, RAIN_HOURS) - RAIN_HOURS) / 24
        const key = `${name} ${eto} ${c} ${rainMm}`
        expect(days, key).toBeGreaterThanOrEqual(printed - PRINTED_TO)
        expect(days, key).toBeLessThanOrEqual(printed + (A_NIGHT_LATER.has(key) ? 0.8 : PRINTED_TO))
      }
    }
  })

  /** What the storm method takes from a rain on a field that is just fit. */
  function runoffOf(soil: FieldSoil, rainMm: number): number {
    const state = justFit(soil)
    run({ ...soil, surfaceStorageMm: 1000 }, evenWeather(RAIN_HOURS, 18, () => rainMm / RAIN_HOURS, () => 12, 0), state)
    return state.total.runoffMm
  }

  // Section 8.5, 0 to 600 mm saturated at midnight, tiled, c 0.02/h, ETo 1 to 4 mm/d; printed to 0.1 d.
  it('falls by about half and more as evapotranspiration doubles, from saturated clay', () => {
    const days = [1, 2, 3, 4].map((eto) => {
      const soil = { ...referenceClay(), capillaryPerHour: 0.02 }
      const state = startingState(soil, 12)
      state.water1Mm = 100 * soil.properties.saturation
      state.water2Mm = 200 * soil.properties.saturation
      state.water3Mm = 300 * soil.properties.saturation
      return run(soil, evenWeather(24 * 30, 0, () => 0, () => 12, eto), state).marks.rocks.indexOf(1) / 24
    })
    for (const [index, printed] of [18.7, 7.6, 4.6, 2.7].entries()) expect(Math.abs(days[index]! - printed)).toBeLessThanOrEqual(PRINTED_TO)
    expect(days[1]! / days[0]!).toBeLessThan(0.55)
    expect(days[3]! / days[1]!).toBeLessThan(0.55)
  })

  it('keeps the order clay, clay loam, loam, sandy loam with the product’s own defaults', () => {
    const soils = [[25, 50, 3], [30, 35, 4], [40, 20, 3], [65, 10, 2]].map(([sandPct, clayPct, organicMatterPct]) =>
      fieldSoil({ sandPct: sandPct!, clayPct: clayPct!, organicMatterPct: organicMatterPct! }, 'tiled', 20))
    for (const eto of ETO) {
      for (const rainMm of [12.7, 25.4, 50.8]) {
        const hours = soils.map(soil => hoursToFit(run(soil, evenWeather(24 * 30, 18, hour => hour < RAIN_HOURS ? rainMm / RAIN_HOURS : 0, () => 12, eto), justFit(soil)).marks))
        expect(hours, `${eto} mm/d, ${rainMm} mm`).toEqual([...hours].sort((a, b) => b - a))
        expect(hours[0]!).toBeGreaterThan(hours[3]!)
      }
    }
  })
})

const anyTexture = fc.constantFrom(CLAY, { sandPct: 5, clayPct: 50, organicMatterPct: 4.5 }, { sandPct: 40, clayPct: 20, organicMatterPct: 3 }, { sandPct: 88, clayPct: 5, organicMatterPct: 1.5 })
const anySoil = fc.tuple(anyTexture, fc.constantFrom('tiled', 'somewhat-poor', 'poor'), fc.integer({ min: 0, max: 100 })).map(([texture, drainage, residuePct]) => fieldSoil(texture, drainage, residuePct))
const anyHours = fc.tuple(
  fc.integer({ min: 0, max: 23 }), fc.double({ min: -18, max: 18, noNaN: true }),
  fc.array(fc.tuple(fc.oneof(fc.constant(0), fc.double({ min: 0, max: 60, noNaN: true })), fc.double({ min: -9, max: 9, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true })), { minLength: 60, maxLength: 200 }),
).map(([fromHour, meanC, hours]) => ({
  ...evenWeather(hours.length, fromHour, hour => hours[hour]![0], hour => meanC + hours[hour]![1], 0),
  etoMm: Float64Array.from(hours, ([, , eto]) => eto),
}))

describe('runFieldModel in any weather', () => {
  it('closes its balance to 1e-6 mm in every hour and keeps each store within its bounds', () => {
    fc.assert(fc.property(anySoil, anyHours, fc.double({ min: 0, max: 150, noNaN: true }), (soil, input, frostIndex) => {
      const state = startingState(soil, 2)
      state.frostIndex = frostIndex
      const before = startingState(soil)
      const trace = createTrace(1)
      for (let hour = 0; hour < input.weather.hours; hour++) {
        copyState(state, before)
        const one = part(input, hour, hour + 1)
        runFieldModel(soil, one.weather, one.etoMm, one.localHour, state, trace)
        expect(Math.abs(balanceErrorMm(before, state))).toBeLessThan(1e-6)
        expect(Math.min(state.snowMm, state.pondMm, state.frostIndex)).toBeGreaterThanOrEqual(0)
        expect(state.pondMm).toBeLessThanOrEqual(soil.surfaceStorageMm + 1e-9)
        expect(state.water1Mm).toBeGreaterThan(0)
        for (const [water, full] of [[state.water1Mm, 100 * soil.properties.saturation], [state.water2Mm, 200 * soil.properties.saturation], [state.water3Mm, 300 * soil.subsoil.saturation]]) {
          expect(water!).toBeGreaterThan(0)
          expect(water!).toBeLessThanOrEqual(full! + 1e-9)
        }
        for (const key of ['inMm', 'runoffMm', 'drainedMm', 'evaporatedMm'] as const) expect(state.total[key]).toBeGreaterThanOrEqual(before.total[key])
      }
    }), { numRuns: 150 })
  })

  it('gives in two parts what it gives in one, cut anywhere', () => {
    fc.assert(fc.property(anySoil, anyHours, fc.double({ min: 0, max: 1, noNaN: true }), (soil, input, share) => {
      const { hours } = input.weather
      const cut = Math.max(1, Math.floor(share * hours))
      const inOne = startingState(soil, 3)
      const inTwo = startingState(soil, 3)
      const whole = run(soil, input, inOne)
      run(soil, part(input, 0, cut), inTwo)
      const rest = run(soil, part(input, cut, hours), inTwo)
      for (const key of ['water1', 'water2', 'snowMm', 'pondMm', 'frostIndex', 'seedZoneFit', 'tillageFit', 'carries', 'surfaceDry', 'frozen'] as const) {
        expect([...rest.trace[key]], key).toEqual([...whole.trace[key].slice(cut)])
      }
      expect(inTwo.mean5C).toBe(inOne.mean5C)
      expect(inTwo.total).toEqual(inOne.total)
    }), { numRuns: 100 })
  })

  it('is never drier for more rain on open ground', () => {
    fc.assert(fc.property(anySoil, fc.integer({ min: 0, max: 40 }), (soil, at) => {
      const weather = (extraMm: number) => evenWeather(96, 6, hour => hour === at ? 4 + extraMm : 0, () => 14, 3)
      const dry = run(soil, weather(0), startingState(soil, 12))
      const wet = run(soil, weather(15), startingState(soil, 12))
      for (let hour = 0; hour < 96; hour++) expect(wet.trace.water1[hour]!).toBeGreaterThanOrEqual(dry.trace.water1[hour]! - 1e-12)
    }), { numRuns: 40 })
  })

  it('keeps no memory outside the state: the same start gives the same trace', () => {
    const soil = fieldSoil(CLAY, 'poor', 30)
    const input = evenWeather(300, 3, hour => hour % 40 < 4 ? 3 : 0, hour => 3 + 6 * Math.sin(hour / 4), 2)
    expect(run(soil, input, startingState(soil, 1))).toEqual(run(soil, input, startingState(soil, 1)))
  })
})

describe('a winter and its end', () => {
  const soil = fieldSoil(CLAY, 'tiled', 20)

  it('freezes, holds the snow, thaws, and is not worked before the frost is out', () => {
    // 60 days at −10 °C with 1 mm of snow every third day, then 40 days of +6 °C.
    const input = evenWeather(24 * 100, 0, hour => hour < 24 * 60 && hour % 72 === 0 ? 1 : 0, hour => hour < 24 * 60 ? -10 : 6, 2)
    const state = startingState(soil, 2)
    const { trace, marks } = run(soil, input, state)
    const thaw = 24 * 60
    expect(trace.snowMm[thaw - 1]!).toBeCloseTo(20, 6)
    expect(trace.frostIndex[thaw - 1]!).toBeGreaterThan(83)
    expect(marks.frozen[thaw + 24]).toBe(1)
    const frostOut = marks.frozen.indexOf(0, thaw)
    const firstFit = marks.dig.indexOf(1, thaw)
    expect(frostOut).toBeGreaterThan(thaw + 24 * 5)
    expect(firstFit).toBeGreaterThanOrEqual(frostOut)
    expect(trace.snowMm[firstFit]).toBe(0)
  })

  it('warms 2 in before 4 in during a warm spell', () => {
    const { trace } = run(soil, evenWeather(24 * 6, 0, () => 0, () => 15, 3), startingState(soil, 4))
    expect(trace.temperature5C[71]!).toBeGreaterThan(trace.temperature10C[71]!)
    expect(trace.seedMeanC[71]!).toBeLessThan(trace.temperature5C[71]!)
  })
})

describe('runFieldModel refuses', () => {
  const soil = fieldSoil(CLAY, 'tiled', 0)
  const good = () => evenWeather(5, 0, () => 0, () => 5, 1)

  it.each([
    ['a gap in the rain', (input: SoilInput) => { input.weather.rainMm[3] = Number.NaN }],
    ['negative rain', (input: SoilInput) => { input.weather.rainMm[3] = -1 }],
    ['a gap in the temperature', (input: SoilInput) => { input.weather.temperatureC[3] = Number.NaN }],
    ['a gap in the evapotranspiration', (input: SoilInput) => { input.etoMm[3] = Number.NaN }],
    ['negative evapotranspiration', (input: SoilInput) => { input.etoMm[3] = -0.1 }],
    ['an hour that no day has', (input: SoilInput) => { input.localHour[3] = 24 }],
  ])('%s, names the hour and changes nothing', (_, spoil) => {
    const input = good()
    spoil(input)
    const state = startingState(soil, 5)
    const untouched = storedMm(state)
    expect(() => runFieldModel(soil, input.weather, input.etoMm, input.localHour, state, createTrace(5))).toThrow(/hour 3/)
    expect(storedMm(state)).toBe(untouched)
    expect(state.mean10C).toBe(5)
  })

  it('arrays of another length and a trace that is too short', () => {
    const { weather, etoMm, localHour } = good()
    expect(() => runFieldModel(soil, weather, etoMm.slice(1), localHour, startingState(soil), createTrace(5))).toThrow(RangeError)
    expect(() => runFieldModel(soil, weather, etoMm, localHour.slice(1), startingState(soil), createTrace(5))).toThrow(RangeError)
    expect(() => runFieldModel(soil, weather, etoMm, localHour, startingState(soil), createTrace(4))).toThrow(RangeError)
  })
})
