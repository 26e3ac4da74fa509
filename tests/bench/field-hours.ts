import { fieldSoil } from '../../shared/agronomy/soil/field-soil'
import { copyState, createTrace, runFieldModel, startingState } from '../../shared/agronomy/soil/water-balance'

const HOURS = 120
const RUNS = 31 * 51
const ROUNDS = 4

/** Field-hours simulated per second on one core, against a bare loop that touches as many typed-array elements. */
export default async function benchFieldHours(log: (line: string) => void): Promise<void> {
  const soil = fieldSoil({ sandPct: 25, clayPct: 50, organicMatterPct: 3 }, 'tiled', 30)
  const column = (value: (i: number) => number) => Float64Array.from({ length: HOURS }, (_, i) => value(i))
  const weather = {
    startsAt: 1_746_525_600, hours: HOURS, rainMm: column(i => i > 50 && i < 70 ? 1.2 : 0), temperatureC: column(i => 9 + 6 * Math.sin(i / 3.8)),
    humidityPct: column(() => 60), windMs: column(() => 4), radiationWm2: column(() => 150),
  }
  const eto = column(i => i % 24 > 6 && i % 24 < 20 ? 0.25 : 0)
  const localHour = Uint8Array.from({ length: HOURS }, (_, i) => (i + 5) % 24)
  const start = startingState(soil, 8)
  const state = startingState(soil, 8)
  const trace = createTrace(HOURS)
  const bare = column(() => 0)
  const model = best(() => {
    copyState(start, state)
    runFieldModel(soil, weather, eto, localHour, state, trace)
  })
  const control = best(() => {
    for (let i = 0; i < HOURS; i++) bare[i] = weather.rainMm[i]! + weather.temperatureC[i]! * 0.5 + eto[i]! + bare[i]! * 0.9
  })
  log(`field model: ${(model / 1e6).toFixed(2)} million field-hours/s, bare typed-array loop ${(control / 1e6).toFixed(0)} million/s, ratio ${(model / control).toFixed(4)}`)
}

function best(once: () => void): number {
  let most = 0
  for (let round = 0; round < ROUNDS; round++) {
    const started = performance.now()
    for (let run = 0; run < RUNS; run++) once()
    most = Math.max(most, RUNS * HOURS / (performance.now() - started) * 1000)
  }
  return most
}
