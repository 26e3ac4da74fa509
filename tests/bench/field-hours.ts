import { fieldSoil } from '../../shared/agronomy/soil/field-soil'
import { copyState, createTrace, runFieldModel, startingState } from '../../shared/agronomy/soil/water-balance'
import { benchWeather, leastMs } from './bench-weather'

const FIELDS = 40
const RUNS = 31
const HOURS = 240
const ROUNDS = 4
const soil = fieldSoil({ sandPct: 25, clayPct: 50, organicMatterPct: 3 }, 'tiled', 30)

/**
 * The soil model against two loops over the same arrays: one that only touches them, and one with the powers and
 * exponentials that a step of three layers can't do without.
 */
export default async function benchFieldHours(log: (line: string) => void): Promise<void> {
  const model = leastMs(ROUNDS, () => runModel(FIELDS, RUNS, HOURS))
  const arithmetic = leastMs(ROUNDS, () => runArithmetic(FIELDS * RUNS, HOURS))
  const bare = leastMs(ROUNDS, () => runBare(FIELDS * RUNS, HOURS))
  const fieldHours = FIELDS * RUNS * HOURS
  log(`soil model, ${FIELDS} fields × ${RUNS} runs × ${HOURS} h: ${model.toFixed(0)} ms, ${(fieldHours / model / 1000).toFixed(2)} million field-hours/s`)
  log(`  bare typed-array loop ${(fieldHours / bare / 1000).toFixed(0)} million/s, ratio ${(bare / model).toFixed(4)}; a step's powers and exponentials alone ${arithmetic.toFixed(0)} ms, the model takes ${(model / arithmetic).toFixed(2)} times that`)
  const exponent = (twice: () => void, once: () => void) => Math.log2(leastMs(ROUNDS, twice) / leastMs(ROUNDS, once)).toFixed(2)
  log(`  cost grows with fields^${exponent(() => runModel(20, 10, HOURS), () => runModel(10, 10, HOURS))}, runs^${exponent(() => runModel(10, 20, HOURS), () => runModel(10, 10, HOURS))}, hours^${exponent(() => runModel(10, 10, 480), () => runModel(10, 10, 240))}`)
}

function runModel(fields: number, runs: number, hours: number): void {
  const { weather, etoMm, localHour } = benchWeather(hours)
  const [start, state, trace] = [startingState(soil, 8), startingState(soil, 8), createTrace(hours)]
  for (let i = 0; i < fields * runs; i++) {
    copyState(start, state)
    runFieldModel(soil, weather, etoMm, localHour, state, trace)
  }
}

/** Three layers' closed-form drainage (a power and its root each), the day's swing, and the evaporation. */
function runArithmetic(times: number, hours: number): void {
  const { weather, etoMm } = benchWeather(hours)
  const out = new Float64Array(hours)
  const n = soil.properties.conductivityExponent
  for (let i = 0; i < times; i++) {
    let [a, b, c] = [0.4, 0.41, 0.42]
    for (let hour = 0; hour < hours; hour++) {
      a = 0.4 * (1 + 0.01 * (a / 0.5) ** n) ** (-1 / (n - 1))
      b = 0.41 * (1 + 0.01 * (b / 0.5) ** n) ** (-1 / (n - 1))
      c = 0.42 * (1 + 0.01 * (c / 0.5) ** n) ** (-1 / (n - 1))
      out[hour] = a + b + c + Math.exp(-0.1 * weather.temperatureC[hour]!) + etoMm[hour]! * (weather.rainMm[hour]! + 1)
    }
  }
}

function runBare(times: number, hours: number): void {
  const { weather, etoMm } = benchWeather(hours)
  const out = new Float64Array(hours)
  for (let i = 0; i < times; i++) for (let hour = 0; hour < hours; hour++) out[hour] = weather.rainMm[hour]! + weather.temperatureC[hour]! * 0.5 + etoMm[hour]! + out[hour]! * 0.9
}
