import { readFile } from 'node:fs/promises'
import { createRequire } from 'node:module'
import { dirname, join } from 'node:path'
import type { DailyPlace, DailyWeather } from '../../shared/agronomy/soil/daily-weather'

/** The station's neighbourhood: Seattle, Washington, beside the Puget Sound, in Pacific Standard Time. */
export const SEATTLE: DailyPlace = { latitudeDeg: 47.4, elevationM: 130, coastal: true, utcOffsetHours: -8 }

const HEADER = 'date,precipitation,temp_max,temp_min,wind,weather'
const DAY_MS = 86_400_000

/**
 * The daily record of Seattle, 2012 to 2015, a United States government dataset that npm's vega-datasets carries. Its
 * own notes call the wind km/h; a mean of 3.2 says m/s, and so it is read.
 */
export async function readSeattle(): Promise<DailyWeather> {
  const packageFolder = dirname(dirname(createRequire(import.meta.url).resolve('vega-datasets')))
  return parseDays(await readFile(join(packageFolder, 'data', 'seattle-weather.csv'), 'utf8'))
}

/** Reads the record's table: one line a day, without gaps. @throws {Error} naming the line that is not as expected */
export function parseDays(table: string): DailyWeather {
  const [header, ...lines] = table.trim().split(/\r?\n/)
  if (header !== HEADER) throw new Error(`The record begins with “${header}”, not “${HEADER}”`)
  const rows = lines.map((line, index) => {
    const [date, ...numbers] = line.split(',').slice(0, 5)
    const values = numbers.map(Number)
    if (values.length !== 4 || numbers.some(text => text === '') || values.some(value => !Number.isFinite(value))) throw new Error(`Line ${index + 2} of the record is “${line}”`)
    return { day: Date.parse(`${date}T00:00:00Z`) / DAY_MS, values }
  })
  for (const [index, { day }] of rows.entries()) {
    if (day !== rows[0]!.day + index) throw new Error(`Line ${index + 2} of the record is not the day after the line before`)
  }
  const column = (at: number) => Float64Array.from(rows, row => row.values[at]!)
  return { firstDay: rows[0]!.day, rainMm: column(0), maxC: column(1), minC: column(2), windMs: column(3) }
}

/** Index of a calendar day in a record. @param localDay - YYYY-MM-DD */
export function dayIndex(record: DailyWeather, localDay: string): number {
  return Date.parse(`${localDay}T00:00:00Z`) / DAY_MS - record.firstDay
}
