import type { HourlyWeather } from '../weather/hourly'
import { LAYER_MM, type FieldSoil } from './field-soil'
import type { FieldState } from './field-state'
import type { FieldTrace } from './field-trace'
import { CARRIES, HELD, holdConditions, isFrozen, SEED_ZONE_FIT, SURFACE_DRY, TILLAGE_FIT } from './fit-rule'
import { advanceWarmth, beginDay, rememberSeedZone, surfaceHalfRangeC, temperature2InC, temperature4InC } from './warmth-hour'
import { advanceWater } from './water-hour'

export { balanceErrorMm, copyState, startingState, storedMm, type FieldState } from './field-state'
export { createTrace, type FieldTrace } from './field-trace'

/**
 * Runs a field through weather hour by hour and writes down what becomes of its water, frost and warmth. Allocates
 * nothing per hour; the balance closes to rounding in every one of them (see balanceErrorMm).
 *
 * Methods: the modules of this folder, in the order snow, runoff, infiltration, bottom outflow, drainage, capillary
 * rise, evaporation, temperatures, fitness. A stretch of weather run in parts gives what it gives in one piece, but
 * for the daily swing of the soil where a part ends within a local day.
 *
 * @param soil - of the field
 * @param weather - rain and temperature are used, without gaps
 * @param etoMm - reference evapotranspiration, mm in each hour, not negative
 * @param localHour - hour of day at the farm, 0 to 23, of each hour
 * @param state - advanced to the end of the weather
 * @param trace - filled; as long as the weather, or longer
 * @throws {RangeError} when an array is too short, or a value is NaN or impossible; names the hour, changes nothing
 */
export function runFieldModel(soil: FieldSoil, weather: HourlyWeather, etoMm: Float64Array, localHour: Uint8Array, state: FieldState, trace: FieldTrace): void {
  refuseUnusable(weather, etoMm, localHour, trace)
  const { hours, rainMm, temperatureC } = weather
  let nextDay = 0
  for (let hour = 0; hour < hours; hour++) {
    if (hour === nextDay) nextDay = beginDay(temperatureC, localHour, hour, state)
    advanceWater(soil, rainMm[hour]!, temperatureC[hour]!, etoMm[hour]!, state)
    advanceWarmth(temperatureC[hour]!, localHour[hour]!, state)
    holdConditions(soil, localHour[hour]!, state)
    record(soil, rainMm[hour]!, localHour[hour]!, state, trace, hour)
  }
}

function refuseUnusable(weather: HourlyWeather, etoMm: Float64Array, localHour: Uint8Array, trace: FieldTrace): void {
  const { hours, rainMm, temperatureC } = weather
  if (rainMm.length !== hours || temperatureC.length !== hours || etoMm.length !== hours || localHour.length !== hours) throw new RangeError(`the weather has ${hours} hours, its arrays do not`)
  if (trace.hours < hours) throw new RangeError(`a trace of ${trace.hours} hours can't hold ${hours}`)
  for (let hour = 0; hour < hours; hour++) {
    if (!(rainMm[hour]! >= 0 && rainMm[hour]! < Infinity)) throw new RangeError(`rain of hour ${hour} is ${rainMm[hour]}`)
    if (!Number.isFinite(temperatureC[hour]!)) throw new RangeError(`temperature of hour ${hour} is ${temperatureC[hour]}`)
    if (!(etoMm[hour]! >= 0 && etoMm[hour]! < Infinity)) throw new RangeError(`evapotranspiration of hour ${hour} is ${etoMm[hour]}`)
    if (localHour[hour]! > 23) throw new RangeError(`local hour of hour ${hour} is ${localHour[hour]}`)
  }
}

function record(soil: FieldSoil, rainMm: number, localHour: number, state: FieldState, trace: FieldTrace, hour: number): void {
  const halfRange = surfaceHalfRangeC(soil, state)
  const seedZoneC = temperature2InC(state, halfRange, localHour)
  trace.water1[hour] = state.water1Mm / LAYER_MM[0]
  trace.water2[hour] = state.water2Mm / LAYER_MM[1]
  trace.temperature5C[hour] = seedZoneC
  trace.temperature10C[hour] = temperature4InC(state, halfRange, localHour)
  trace.seedMeanC[hour] = rememberSeedZone(state.seed, seedZoneC)
  trace.snowMm[hour] = state.snowMm
  trace.pondMm[hour] = state.pondMm
  trace.rainMm[hour] = rainMm
  trace.frostIndex[hour] = state.frostIndex
  trace.frozen[hour] = isFrozen(state.frostIndex, state.mean10C) ? 1 : 0
  trace.seedZoneFit[hour] = state.held[SEED_ZONE_FIT] === HELD ? 1 : 0
  trace.tillageFit[hour] = state.held[TILLAGE_FIT] === HELD ? 1 : 0
  trace.carries[hour] = state.held[CARRIES] === HELD ? 1 : 0
  trace.surfaceDry[hour] = state.held[SURFACE_DRY] === HELD ? 1 : 0
}
