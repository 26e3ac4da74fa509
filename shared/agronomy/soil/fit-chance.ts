import type { HourlyWeather } from '../weather/hourly'
import type { Particle, ParticleRoom } from './particles'
import { runParticle } from './particles'
import { copyState, startingState, type FieldState } from './water-balance'

/** When a field becomes fit, over all runs of the forecast and all versions of the field (soil.md 10). */
export interface FitChance {
  hours: number
  /** chance of having been fit by the end of each hour, 0 to 1, never falling */
  fitBy: Float64Array
}

export type GroundFlag = 'seedZoneFit' | 'tillageFit' | 'carries' | 'surfaceDry'

/**
 * Runs every run of the forecast through every version of the field.
 *
 * @param runs - weather of equal length, each with its reference evapotranspiration
 * @param flag - the condition that counts
 * @throws {RangeError} without runs or versions, or when runs differ in length
 */
export function fitChance(particles: readonly Particle[], runs: readonly { weather: HourlyWeather, etoMm: Float64Array }[], localHour: Uint8Array, flag: GroundFlag, room: ParticleRoom): FitChance {
  const hours = runs[0]?.weather.hours ?? 0
  if (particles.length === 0 || hours === 0 || runs.some(({ weather }) => weather.hours !== hours)) throw new RangeError('The chance needs versions, and runs of one length')
  const fitBy = new Float64Array(hours)
  const ahead = startingState(particles[0]!.soil)
  for (const particle of particles) {
    for (const { weather, etoMm } of runs) {
      const first = firstFit(particle, weather, etoMm, localHour, flag, ahead, room)
      if (first < hours) fitBy[first]! += particle.weight / runs.length
    }
  }
  for (let hour = 1; hour < hours; hour++) fitBy[hour]! += fitBy[hour - 1]!
  return { hours, fitBy: fitBy.map(chance => Math.min(1, chance)) }
}

function firstFit(particle: Particle, weather: HourlyWeather, etoMm: Float64Array, localHour: Uint8Array, flag: GroundFlag, ahead: FieldState, room: ParticleRoom): number {
  copyState(particle.state, ahead)
  const first = runParticle(particle, weather, etoMm, localHour, ahead, room)[flag].indexOf(1)
  return first < 0 || first >= weather.hours ? Infinity : first
}

/**
 * Hour by whose end the chance reaches a share, from 0; null: not within the hours ("not within 10 days").
 * @throws {RangeError} when the share is not above 0 and at most 1
 */
export function hourOfChance({ fitBy }: FitChance, share: number): number | null {
  if (!(share > 0 && share <= 1)) throw new RangeError(`The share (${share}) must be above 0 and at most 1`)
  const hour = fitBy.findIndex(chance => chance >= share - 1e-12)
  return hour < 0 ? null : hour
}
