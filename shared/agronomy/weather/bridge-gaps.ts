import type { HourlyWeather } from './hourly'

/** Longest gap that is bridged, hours; a setting. Behind it a figure stops, with a reason. */
export const LONGEST_GAP_H = 3

const COLUMNS = ['rainMm', 'temperatureC', 'humidityPct', 'windMs', 'radiationWm2'] as const
type Column = (typeof COLUMNS)[number]

/** What weather can be: name in words, unit, least and most. Beyond it a value is a fault, not weather. */
const RANGES: Record<Column, { name: string, unit: string, least: number, most: number }> = {
  rainMm: { name: 'rain', unit: 'mm', least: 0, most: 200 },
  temperatureC: { name: 'temperature', unit: '°C', least: -60, most: 55 },
  humidityPct: { name: 'humidity', unit: '%', least: 0, most: 100 },
  windMs: { name: 'wind', unit: 'm/s', least: 0, most: 75 },
  radiationWm2: { name: 'radiation', unit: 'W/m²', least: 0, most: 1400 },
}

/** Hours that were made up between their neighbours, to be shown as such. */
export interface Bridged { column: Column, from: number, hours: number }

/**
 * Bridges short gaps (NaN) by straight lines between their neighbours, and names them. At an end the nearest value is
 * held. Rain is bridged as a rate, never as nothing.
 *
 * @returns the weather without gaps, a copy where anything was bridged, and the hours that were
 * @throws {RangeError} naming the hour, when a gap is longer than 3 h, a column is empty, or a value is none that weather has
 */
export function bridgeGaps(weather: HourlyWeather): { weather: HourlyWeather, bridged: Bridged[] } {
  const bridged: Bridged[] = []
  const columns = Object.fromEntries(COLUMNS.map(column => [column, bridgeColumn(weather, column, bridged)]))
  return { weather: bridged.length > 0 ? { ...weather, ...columns } : weather, bridged }
}

function bridgeColumn({ startsAt, hours, ...columns }: HourlyWeather, column: Column, bridged: Bridged[]): Float64Array {
  const values = columns[column]
  const { name, unit, least, most } = RANGES[column]
  const said = (hour: number) => new Date((startsAt + hour * 3600) * 1000).toISOString()
  if (values.length !== hours) throw new RangeError(`The ${name} has ${values.length} hours, not ${hours}`)
  const impossible = values.findIndex(value => value < least || value > most)
  if (impossible >= 0) throw new RangeError(`The ${name} of ${said(impossible)} is ${values[impossible]} ${unit}: it must be ${least} to ${most} ${unit}`)
  const filled = Float64Array.from(values)
  for (let from = 0; from < hours; from++) {
    if (!Number.isNaN(values[from]!)) continue
    let to = from
    while (to < hours && Number.isNaN(values[to]!)) to++
    if (to - from > LONGEST_GAP_H || to - from === hours) throw new RangeError(`The ${name} is not known for ${to - from} hours from ${said(from)}; up to ${LONGEST_GAP_H} are bridged`)
    const [before, after] = [from > 0 ? values[from - 1]! : values[to]!, to < hours ? values[to]! : values[from - 1]!]
    for (let hour = from; hour < to; hour++) filled[hour] = before + (after - before) * (hour - from + 1) / (to - from + 1)
    bridged.push({ column, from, hours: to - from })
    from = to
  }
  return filled
}
