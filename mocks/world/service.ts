import { momentAt, radiationAt, rainBetween, TRUTH, type Moment, type Place, type Scenario } from './season'

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

/** A value at its label, from the moment of the label, the middle of the hour before it, and that hour's rain. Gusts of runs are never asked for. */
const VARIABLES = {
  temperature_2m: ({ at }) => at.temperatureC,
  relative_humidity_2m: ({ at }) => at.humidityPct,
  dew_point_2m: ({ at }) => at.dewPointC,
  cloud_cover: ({ at }) => at.cloudPct,
  wind_speed_10m: ({ at }) => at.windMs,
  wind_direction_10m: ({ at }) => at.windFromDeg,
  wind_gusts_10m: ({ gustMs }) => gustMs(),
  precipitation: ({ rainMm }) => rainMm,
  shortwave_radiation: ({ radiationWm2 }) => radiationWm2,
} satisfies Record<string, (hour: Hour) => number>

interface Hour { at: Moment, gustMs: () => number, radiationWm2: number, rainMm: number }

export type Variable = keyof typeof VARIABLES

export function isVariable(name: string): name is Variable {
  return Object.hasOwn(VARIABLES, name)
}

const DECIMALS: Partial<Record<Variable, number>> = { precipitation: 2, relative_humidity_2m: 0, wind_direction_10m: 0, shortwave_radiation: 0, cloud_cover: 0 }
const remembered = new Map<string, Hour[]>()
const MOST_REMEMBERED = 2000

/**
 * One column of an answer: analysis for labels that are over, the cycle's forecast for those to come.
 *
 * @param from - first label, Unix hours
 * @param run - 0 the control, −1 the single best forecast
 */
export function column(variable: Variable, place: Place, from: number, hours: number, nowHours: number, run: number): number[] {
  const digits = 10 ** (DECIMALS[variable] ?? 1)
  return hoursOf(place, from, hours, nowHours, run).map(hour => Math.round(VARIABLES[variable](hour) * digits) / digits)
}

function hoursOf(place: Place, from: number, hours: number, nowHours: number, run: number): Hour[] {
  const cycle = newestCycle(nowHours)
  const over = Math.floor(nowHours)
  const key = [place.latitude, place.longitude, from, hours, over, cycle, run].join()
  const known = remembered.get(key)
  if (known) return known
  const believed = { madeAt: cycle, run }
  const made = Array.from({ length: hours }, (_, i) => from + i <= over ? pastHour(place, from + i) : hourOf(place, from + i, believed))
  if (remembered.size >= MOST_REMEMBERED) remembered.clear()
  remembered.set(key, made)
  return made
}

function hourOf(place: Place, label: number, scenario: Scenario): Hour {
  return {
    at: momentAt(label, place, scenario),
    gustMs: () => momentAt(label - 0.5, place, scenario).gustMs,
    radiationWm2: radiationAt(label - 0.5, place, scenario),
    rainMm: rainBetween(label - 1, label, place, scenario),
  }
}

const past = new Map<string, Hour>()
const MOST_PAST = 50_000

/** What is over is the same for every run and every later cycle. */
function pastHour(place: Place, label: number): Hour {
  const key = [place.latitude, place.longitude, label].join()
  const known = past.get(key)
  if (known) return known
  if (past.size >= MOST_PAST) past.clear()
  const made = hourOf(place, label, TRUTH)
  past.set(key, made)
  return made
}
