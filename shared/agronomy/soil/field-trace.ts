/**
 * What the model writes down, one element an hour, `hours` long. Water, snow, pond and frost are those at the end of
 * the hour, temperatures those of its middle.
 */
export interface FieldTrace {
  hours: number
  /** 0 to 100 mm, m³/m³ */
  water1: Float64Array
  /** 100 to 300 mm, m³/m³ */
  water2: Float64Array
  /** at 2 in, °C */
  temperature5C: Float64Array
  /** at 4 in, °C */
  temperature10C: Float64Array
  /** mean at 2 in over the last 72 hours, or as many as have been seen, °C */
  seedMeanC: Float64Array
  /** water in the snow, mm */
  snowMm: Float64Array
  /** standing water, mm */
  pondMm: Float64Array
  /** rain and snow of the hour as they fell, mm of water */
  rainMm: Float64Array
  /** °C·d */
  frostIndex: Float64Array
  /** 1 when frost keeps the ground shut */
  frozen: Uint8Array
  /** 1 when the condition is held through the hour: see holdConditions */
  seedZoneFit: Uint8Array
  tillageFit: Uint8Array
  carries: Uint8Array
  surfaceDry: Uint8Array
}

/**
 * Room for a trace, to be used again and again.
 *
 * @param hours - a whole number, not negative
 * @throws {RangeError} when it is not
 */
export function createTrace(hours: number): FieldTrace {
  if (!(Number.isInteger(hours) && hours >= 0)) throw new RangeError(`${hours} is not a number of hours`)
  return {
    hours,
    water1: new Float64Array(hours),
    water2: new Float64Array(hours),
    temperature5C: new Float64Array(hours),
    temperature10C: new Float64Array(hours),
    seedMeanC: new Float64Array(hours),
    snowMm: new Float64Array(hours),
    pondMm: new Float64Array(hours),
    rainMm: new Float64Array(hours),
    frostIndex: new Float64Array(hours),
    frozen: new Uint8Array(hours),
    seedZoneFit: new Uint8Array(hours),
    tillageFit: new Uint8Array(hours),
    carries: new Uint8Array(hours),
    surfaceDry: new Uint8Array(hours),
  }
}
