import type { HourlyWeather } from '../weather/hourly'
import { totalEvaporableMm } from './evaporation'
import { LAYER_MM, type FieldSoil } from './field-soil'
import { chanceOfCall, type Call } from './learning'
import { normalNumber, type Random } from './random'
import { copyState, createTrace, runFieldModel, startingState, type FieldState, type FieldTrace } from './water-balance'

/**
 * What the model does not know of a field, as many versions of it: each with its own soil, its own rain and
 * evaporation, and a weight. Readings weigh the versions anew (soil.md 11.2 and 11.4).
 */
export interface Particle {
  soil: FieldSoil
  /** of the rain that the grid reports */
  rainFactor: number
  /** of the reference evapotranspiration */
  etoFactor: number
  /** all of them add up to 1 */
  weight: number
  state: FieldState
}

/** Spreads of the priors (soil.md 11.2). Those without a published basis are settings. */
export const PRIORS = {
  fieldCapacitySd: 0.02, logConductivitySd: 1, fitShareSd: 0.04, fitShareRange: [0.8, 1], capillaryRange: [0.003, 0.04], logDrainageSd: 0.42,
  cropCoefficientSd: 0.08, meltSd: 1, logGridRainSd: 0.35, logGaugeRainSd: 0.09, etoSd: 0.15,
} as const
/** Spreads by which a resampled version is shaken, so that copies don't stay copies. */
const SHAKE = { fitWater: 0.005, logCapillary: 0.1, logConductivity: 0.1 } as const

const clamp = (value: number, low: number, high: number) => Math.min(high, Math.max(low, value))

/**
 * Draws versions of a field from the priors around its soil.
 *
 * @param count - whole, at least 1
 * @param rain - what the field's past rain comes from
 * @param soilC - soil temperature to start from, °C; left out: the first day's air
 * @throws {RangeError} when the count is none
 */
export function drawParticles(soil: FieldSoil, count: number, random: Random, rain: 'grid' | 'gauge' = 'grid', soilC?: number): Particle[] {
  if (!(Number.isInteger(count) && count >= 1)) throw new RangeError(`The number of particles (${count}) must be whole and at least 1`)
  const rainSd = rain === 'grid' ? PRIORS.logGridRainSd : PRIORS.logGaugeRainSd
  return Array.from({ length: count }, () => {
    const drawn = drawSoil(soil, random)
    return { soil: drawn, rainFactor: Math.exp(rainSd * normalNumber(random)), etoFactor: Math.max(0.3, 1 + PRIORS.etoSd * normalNumber(random)), weight: 1 / count, state: startingState(drawn, soilC) }
  })
}

function drawSoil(soil: FieldSoil, random: Random): FieldSoil {
  const shift = PRIORS.fieldCapacitySd * normalNumber(random)
  const faster = Math.exp(PRIORS.logConductivitySd * normalNumber(random))
  const vary = (properties: FieldSoil['properties']) => ({
    ...properties,
    fieldCapacity: clamp(properties.fieldCapacity + shift, properties.wiltingPoint + 0.02, properties.saturation - 0.02),
    saturatedConductivityMmH: properties.saturatedConductivityMmH * faster,
  })
  const properties = vary(soil.properties)
  const share = soil.fitWater / soil.properties.fieldCapacity
  // Coarse ground is fit above its field capacity; its share is varied about itself.
  const [low, high] = share <= 1 ? PRIORS.fitShareRange : [share - 0.1, share + 0.1]
  const fitWater = clamp(share + PRIORS.fitShareSd * normalNumber(random), low, high) * properties.fieldCapacity
  const [slow, quick] = PRIORS.capillaryRange
  const totalMm = totalEvaporableMm(properties.fieldCapacity, properties.wiltingPoint, LAYER_MM[0] / 1000)
  return {
    ...soil,
    properties,
    subsoil: vary(soil.subsoil),
    fitWater,
    carryWater: Math.max(fitWater, soil.carryWater + shift),
    capillaryPerHour: slow * (quick / slow) ** random(),
    bottomMmPerDay: soil.bottomMmPerDay * Math.exp(PRIORS.logDrainageSd * normalNumber(random)),
    cropCoefficient: Math.max(0.5, soil.cropCoefficient + PRIORS.cropCoefficientSd * normalNumber(random)),
    meltMmPerDegreeDay: Math.max(0.5, soil.meltMmPerDegreeDay + PRIORS.meltSd * normalNumber(random)),
    readilyEvaporableMm: Math.min(soil.readilyEvaporableMm, totalMm),
    totalEvaporableMm: totalMm,
  }
}

/** Arrays that running particles writes to, made once. */
export interface ParticleRoom { weather: HourlyWeather, etoMm: Float64Array, trace: FieldTrace }

/** Room for stretches of up to some hours. @throws {RangeError} when the hours are none */
export function particleRoom(hours: number): ParticleRoom {
  const trace = createTrace(hours)
  return { weather: { startsAt: 0, hours: 0, rainMm: new Float64Array(hours), temperatureC: new Float64Array(0), humidityPct: new Float64Array(0), windMs: new Float64Array(0), radiationWm2: new Float64Array(0) }, etoMm: new Float64Array(hours), trace }
}

/**
 * Runs one version through weather, with its own rain and evaporation.
 *
 * @param state - advanced; the particle's own, or a copy that looks ahead
 * @returns the trace in `room`, valid until the next run
 * @throws {RangeError} when the weather has a gap or the room is too small
 */
export function runParticle(particle: Particle, weather: HourlyWeather, etoMm: Float64Array, localHour: Uint8Array, state: FieldState, room: ParticleRoom): FieldTrace {
  const { hours } = weather
  if (room.etoMm.length < hours) throw new RangeError(`There is room for ${room.etoMm.length} hours, not for ${hours}`)
  const rainMm = room.weather.rainMm.subarray(0, hours)
  const eto = room.etoMm.subarray(0, hours)
  for (let hour = 0; hour < hours; hour++) {
    rainMm[hour] = weather.rainMm[hour]! * particle.rainFactor
    eto[hour] = etoMm[hour]! * particle.etoFactor
  }
  room.trace.hours = hours
  runFieldModel(particle.soil, { ...weather, rainMm }, eto, localHour, state, room.trace)
  return room.trace
}

/** Advances every version to the end of the weather: a new hour costs an hour, not the season. */
export function advanceParticles(particles: readonly Particle[], weather: HourlyWeather, etoMm: Float64Array, localHour: Uint8Array, room: ParticleRoom): void {
  for (const particle of particles) runParticle(particle, weather, etoMm, localHour, particle.state, room)
}

/** Water of the top 100 mm over the fit level, m³/m³, of one version. */
export function waterOverFit({ state, soil }: Particle): number {
  return state.water1Mm / LAYER_MM[0] - soil.fitWater
}

/** Mean and standard deviation over the versions. */
export function beliefOf(particles: readonly Particle[], of: (particle: Particle) => number): { value: number, spread: number } {
  const value = particles.reduce((sum, particle) => sum + particle.weight * of(particle), 0)
  return { value, spread: Math.sqrt(particles.reduce((sum, particle) => sum + particle.weight * (of(particle) - value) ** 2, 0)) }
}

/** How many equal versions the weights are worth: 1/Σw². */
export function effectiveNumber(particles: readonly Particle[]): number {
  return 1 / particles.reduce((sum, { weight }) => sum + weight ** 2, 0)
}

/**
 * Weighs the versions by how well each foretold a reading, and draws them anew when few carry the weight.
 *
 * @param likelihood - of the reading under a version, ≥ 0
 * @returns the versions to go on with; the given ones are not changed
 * @throws {RangeError} when no version could have given the reading
 */
export function learn(particles: readonly Particle[], likelihood: (particle: Particle) => number, random: Random): Particle[] {
  const weights = particles.map(particle => particle.weight * likelihood(particle))
  const total = weights.reduce((sum, weight) => sum + weight, 0)
  if (!(total > 0)) throw new RangeError('No version of the field could have given that reading')
  const weighed = particles.map((particle, i) => ({ ...particle, weight: weights[i]! / total }))
  return effectiveNumber(weighed) < particles.length / 2 ? resample(weighed, random) : weighed
}

/** A person's call on the ground by hand (soil.md 11.4). @throws {RangeError} as `learn` */
export function learnCall(particles: readonly Particle[], call: Call, random: Random): Particle[] {
  return learn(particles, particle => chanceOfCall(call, waterOverFit(particle)), random)
}

/**
 * A probe's reading of the water of the top 100 mm (soil.md 11.5).
 * @param water - m³/m³
 * @param spread - of the probe, m³/m³, above 0
 * @throws {RangeError} as `learn`, or when the spread is not above 0
 */
export function learnProbe(particles: readonly Particle[], water: number, spread: number, random: Random): Particle[] {
  if (!(spread > 0) || Number.isNaN(water)) throw new RangeError(`A reading of ${water} with a spread of ${spread} is none`)
  return learn(particles, ({ state }) => Math.exp(-(((state.water1Mm / LAYER_MM[0] - water) / spread) ** 2) / 2), random)
}

/** Systematic resampling (Kitagawa 1996): as many versions, equal weights, each shaken a little. */
function resample(particles: readonly Particle[], random: Random): Particle[] {
  const n = particles.length
  let [at, reached] = [0, particles[0]!.weight]
  const start = random() / n
  return Array.from({ length: n }, (_, i) => {
    while (reached < start + i / n && at < n - 1) reached += particles[++at]!.weight
    return shaken(particles[at]!, 1 / n, random)
  })
}

function shaken({ soil, state, ...rest }: Particle, weight: number, random: Random): Particle {
  const faster = Math.exp(SHAKE.logConductivity * normalNumber(random))
  const quicken = (properties: FieldSoil['properties']) => ({ ...properties, saturatedConductivityMmH: properties.saturatedConductivityMmH * faster })
  const own: FieldSoil = {
    ...soil,
    fitWater: Math.max(soil.properties.wiltingPoint, soil.fitWater + SHAKE.fitWater * normalNumber(random)),
    capillaryPerHour: clamp(soil.capillaryPerHour * Math.exp(SHAKE.logCapillary * normalNumber(random)), ...PRIORS.capillaryRange),
    properties: quicken(soil.properties),
    subsoil: quicken(soil.subsoil),
  }
  const copy = startingState(own)
  copyState(state, copy)
  return { ...rest, soil: own, weight, state: copy }
}

/** The versions as they stand, to go back to when a reading comes late. */
export function snapshotOf(particles: readonly Particle[]): Particle[] {
  return particles.map((particle) => {
    const state = startingState(particle.soil)
    copyState(particle.state, state)
    return { ...particle, state }
  })
}
