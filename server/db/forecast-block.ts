import { deflateRawSync, inflateRawSync } from 'node:zlib'
import type { WeatherVariable } from '../gateways/weather/weather-gateway'

/** Smallest step that a stored value keeps. Finer than any forecast is good for. */
export const RESOLUTION: Record<WeatherVariable, number> = { rainMm: 0.01, temperatureC: 0.01, humidityPct: 0.02, windMs: 0.01, radiationWm2: 0.1, windDirectionDeg: 0.1, gustMs: 0.01 }

/**
 * Packs variables × runs × hours into a deflated block of 16-bit steps.
 *
 * @throws {RangeError} when a value is missing or too large for its step
 */
export function packBlock(variables: readonly WeatherVariable[], runs: readonly Partial<Record<WeatherVariable, Float64Array>>[], hours: number): Buffer {
  const steps = new Int16Array(variables.length * runs.length * hours)
  let at = 0
  for (const variable of variables) {
    for (const run of runs) {
      const column = run[variable]
      for (let i = 0; i < hours; i++) {
        const step = Math.round((column?.[i] ?? Number.NaN) / RESOLUTION[variable])
        if (!(Math.abs(step) <= 32_767)) throw new RangeError(`${variable} of hour ${i} can't be stored: ${column?.[i]}`)
        steps[at++] = step
      }
    }
  }
  return deflateRawSync(Buffer.from(steps.buffer), { level: 4 })
}

/** The reverse: one entry a run. */
export function unpackBlock<Variable extends WeatherVariable>(data: Buffer, variables: readonly Variable[], runs: number, hours: number): Record<Variable, Float64Array>[] {
  const bytes = inflateRawSync(data)
  const steps = new Int16Array(bytes.buffer, bytes.byteOffset, bytes.byteLength / 2)
  return Array.from({ length: runs }, (_, run) => Object.fromEntries(variables.map((variable, v) => {
    const from = (v * runs + run) * hours
    const column = new Float64Array(hours)
    for (let i = 0; i < hours; i++) column[i] = steps[from + i]! * RESOLUTION[variable]
    return [variable, column]
  })) as Record<Variable, Float64Array>)
}
