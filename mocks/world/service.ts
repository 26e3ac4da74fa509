import { momentAt, rainBetween, TRUTH, type Place, type Scenario } from './season'

/** What the invented service would answer: hour labels as the real one has them. */

/** Cycles start every six hours and can be had 3 h 40 min later. */
const CYCLE_HOURS = 6
const AVAILABLE_AFTER_HOURS = 3 + 40 / 60
export const RUNS = 51

/** The newest cycle that can be had, Unix hours. */
export function newestCycle(nowHours: number): number {
  return Math.floor((nowHours - AVAILABLE_AFTER_HOURS) / CYCLE_HOURS) * CYCLE_HOURS
}

export function availableAt(cycle: number): number {
  return cycle + AVAILABLE_AFTER_HOURS
}

const VARIABLES = {
  temperature_2m: (label, place, scenario) => momentAt(label, place, scenario).temperatureC,
  relative_humidity_2m: (label, place, scenario) => momentAt(label, place, scenario).humidityPct,
  dew_point_2m: (label, place, scenario) => momentAt(label, place, scenario).dewPointC,
  cloud_cover: (label, place, scenario) => momentAt(label, place, scenario).cloudPct,
  wind_speed_10m: (label, place, scenario) => momentAt(label, place, scenario).windMs,
  wind_direction_10m: (label, place, scenario) => momentAt(label, place, scenario).windFromDeg,
  wind_gusts_10m: (label, place, scenario) => momentAt(label - 0.5, place, scenario).gustMs,
  precipitation: (label, place, scenario) => rainBetween(label - 1, label, place, scenario),
  shortwave_radiation: (label, place, scenario) => momentAt(label - 0.5, place, scenario).radiationWm2,
} satisfies Record<string, (label: number, place: Place, scenario: Scenario) => number>

export type Variable = keyof typeof VARIABLES

export function isVariable(name: string): name is Variable {
  return Object.hasOwn(VARIABLES, name)
}

const DECIMALS: Partial<Record<Variable, number>> = { precipitation: 2, relative_humidity_2m: 0, wind_direction_10m: 0, shortwave_radiation: 0, cloud_cover: 0 }
const remembered = new Map<string, number[]>()
const MOST_REMEMBERED = 4000

/**
 * One column of an answer: analysis for labels that are over, the cycle's forecast for those to come.
 *
 * @param from - first label, Unix hours
 * @param run - 0 the control, −1 the single best forecast
 */
export function column(variable: Variable, place: Place, from: number, hours: number, nowHours: number, run: number): number[] {
  const cycle = newestCycle(nowHours)
  const over = Math.floor(nowHours)
  const key = [variable, place.latitude, place.longitude, from, hours, over, cycle, run].join()
  const known = remembered.get(key)
  if (known) return known
  const values: number[] = []
  const digits = 10 ** (DECIMALS[variable] ?? 1)
  for (let label = from; label < from + hours; label++) {
    const scenario = label <= over ? TRUTH : { madeAt: cycle, run }
    values.push(Math.round(VARIABLES[variable](label, place, scenario) * digits) / digits)
  }
  if (remembered.size >= MOST_REMEMBERED) remembered.clear()
  remembered.set(key, values)
  return values
}
