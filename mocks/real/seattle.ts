import { spreadDays, type DailyWeather } from '../../shared/agronomy/soil/daily-weather'
import { fieldSoil } from '../../shared/agronomy/soil/field-soil'
import type { SoilTexture } from '../../shared/agronomy/soil/properties'
import { daysFit, runSeason, type Season } from '../../shared/agronomy/soil/season'
import { dayIndex, readSeattle, SEATTLE } from './seattle-record'

/** The soil model's eight default soils, from clay to sand. */
export const TEXTURES = {
  'clay': { sandPct: 25, clayPct: 50, organicMatterPct: 3 },
  'silty clay': { sandPct: 5, clayPct: 50, organicMatterPct: 4.5 },
  'silty clay loam': { sandPct: 10, clayPct: 33, organicMatterPct: 4 },
  'clay loam': { sandPct: 30, clayPct: 35, organicMatterPct: 4 },
  'loam': { sandPct: 40, clayPct: 20, organicMatterPct: 3 },
  'silt loam': { sandPct: 20, clayPct: 15, organicMatterPct: 3 },
  'sandy loam': { sandPct: 65, clayPct: 10, organicMatterPct: 2 },
  'sand': { sandPct: 88, clayPct: 5, organicMatterPct: 1.5 },
} as const satisfies Record<string, SoilTexture>
export type Texture = keyof typeof TEXTURES
export const TEXTURE_NAMES = Object.keys(TEXTURES) as Texture[]

/** Nobody wrote down when in the day it rained, so each season is run with the rain in each quarter of the day. */
export const RAIN_FROM_HOURS = [0, 6, 12, 18]
export const YEARS = [2012, 2013, 2014, 2015]
/** Residue on the ground, percent, and its drainage: the demo's middling field. */
const RESIDUE_PCT = 20

/** A season for each texture, with the rain in one quarter of the day. */
export function seasonsOf(record: DailyWeather, rainFromHour: number): Record<Texture, Season> {
  const hours = spreadDays(record, SEATTLE, rainFromHour)
  const entries = TEXTURE_NAMES.map(name => [name, runSeason(fieldSoil(TEXTURES[name], 'tiled', RESIDUE_PCT), hours)] as const)
  return Object.fromEntries(entries) as Record<Texture, Season>
}

/** Indices of the first day of a month and of the day behind 31 May. */
export function springOf(record: DailyWeather, year: number, from: '03-01' | '04-01'): [from: number, to: number] {
  return [dayIndex(record, `${year}-${from}`), dayIndex(record, `${year}-06-01`)]
}

/** Rain between two days of a record, mm. */
export function rainMm(record: DailyWeather, from: number, to: number): number {
  return record.rainMm.subarray(from, to).reduce((sum, mm) => sum + mm, 0)
}

/** Days fit between two days of the record, the mean over the quarters in which it may have rained. */
export function meanDaysFit(runs: readonly Record<Texture, Season>[], name: Texture, from: number, to: number): number {
  return runs.reduce((sum, run) => sum + daysFit(run[name], from, to), 0) / runs.length
}

/** Prints the days fit for tillage in each spring and texture. */
export async function printSeattle(log: (line: string) => void): Promise<void> {
  const record = await readSeattle()
  const runs = RAIN_FROM_HOURS.map(hour => seasonsOf(record, hour))
  log('Days fit for tillage from 1 April to 31 May (61 days) on tiled ground with 20 % residue.')
  log('Weather: Seattle, measured by the day, United States government data. In which quarter of the day it rained is not')
  log('known, so each figure is the mean over the four.')
  log('')
  log(row('', YEARS.map(String)))
  for (const name of TEXTURE_NAMES) log(row(name, YEARS.map(year => meanDaysFit(runs, name, ...springOf(record, year, '04-01')).toFixed(1))))
  log('')
  log(row('rain, 1 April to 31 May, mm', YEARS.map(year => rainMm(record, ...springOf(record, year, '04-01')).toFixed(0))))
  log(row('rain, 1 March to 31 May, mm', YEARS.map(year => rainMm(record, ...springOf(record, year, '03-01')).toFixed(0))))
  log('')
  log('Heavy ground remembers March: 2013 had the wettest April and May but a dry March, and clay was fit for longer than')
  log('in 2012 and 2014. Silt loam comes out too quick: its conductivity at field capacity is overestimated.')
  const worst = Math.max(...runs.flatMap(run => Object.values(run)).map(season => Math.abs(season.balanceErrorMm)))
  log(`Over four years the water balance closes to ${worst.toExponential(0)} mm in the worst of ${runs.length * TEXTURE_NAMES.length} runs.`)
}

function row(name: string, cells: string[]): string {
  return name.padEnd(28) + cells.map(cell => cell.padStart(8)).join('')
}
