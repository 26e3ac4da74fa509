import type { Ground, Pass } from '../agronomy/ground'
import type { FieldId, Instant, LocalDay, MachineId } from './ids'

/**
 * The Ground order as it travels: everything that Today shows, in SI units (acres are stored as acres).
 * Hour arrays start at `axis.startsAt`, one element an hour, `axis.hours` long unless said otherwise.
 * `null` means not known; it is never written as 0.
 */
export interface GroundOrder {
  farm: FarmSummary
  now: Instant
  axis: { startsAt: Instant, hours: number }
  forecast: ForecastSummary
  rainLine: RainLine
  ribbon: Ribbon | null
  /** Fields with work left, in the order to do them, then those that can't be ranked (`rank: null`). */
  rows: GroundRow[]
  /** Fields that are planted: out of the list, kept so that nobody wonders where they went. */
  planted: PlantedField[]
  machines: MachineLane[]
  totals: { areaLeftAc: number, atStakeUsd: number | null }
  /** Plain sentences about what is missing and what to do, one each. */
  missing: string[]
}

export interface FarmSummary {
  slug: string
  name: string
  zone: string
  units: UnitSystem
  /** True when the farm is made up, which every page then says. */
  invented: boolean
}
export type UnitSystem = 'us' | 'metric'

export interface ForecastSummary {
  /** fresh; late: missed at least one pull, still used; expired: too old, nothing is computed from it; none: never had one. */
  status: 'fresh' | 'late' | 'expired' | 'none'
  issuedAt: Instant | null
  fetchedAt: Instant | null
  runs: number | null
  source: string | null
  attribution: { text: string, href: string, licence: string }
  /** True when the weather itself is made up. */
  invented: boolean
  /** Plain words on why the last pull failed, when it did. */
  trouble: string | null
}

export interface RainLine {
  status: 'known' | 'none-in-horizon' | 'not-known'
  /** Half, 1 in 10 and 9 in 10 of the runs have started raining by then; null: not within the horizon. */
  medianAt: Instant | null
  earlyAt: Instant | null
  lateAt: Instant | null
  /** Share of runs that start within the horizon, 0 to 1. */
  share: number | null
  /** Median over the runs of the rain in the 48 h after their own onset, mm. */
  likelyMm: number | null
  /** The cumulative rain that counts as 'started', mm. */
  thresholdMm: number
}

export interface Ribbon {
  /** In the middle run, as ground and bars are drawn, mm in the hour. */
  rainMm: number[]
  /** Share of runs wetter than 0.1 mm in the hour, 0 to 1. */
  chance: number[]
  temperatureC: number[]
  windMs: number[]
  gustMs: (number | null)[]
  /** Direction that the wind comes from, degrees from north. */
  windDirectionDeg: number[]
  days: { localDay: LocalDay, startsAt: Instant, minC: number | null, maxC: number | null, rainMm: number | null }[]
  /** Sunset to sunrise, clipped to the axis. */
  nights: { from: Instant, to: Instant }[]
}

export type { Ground, Pass }

export interface GroundRow {
  id: FieldId
  rank: number | null
  name: string
  areaAc: number
  crop: string | null
  soil: string | null
  ground: Ground | null
  /** Two chambers of the soil core; null without a soil. */
  core: { seedZone: CoreChamber, below: CoreChamber } | null
  /** Five entries, Dig to Spray. */
  chain: PassProgress[]
  /** One line of plain words: why it stands where it stands. */
  reason: string
  /** False: below the dashed cut, unlikely before the rain line. */
  beforeRain: boolean
  doneBeforeRain: Chance | null
  atStake: Spread | null
  savedPerPlanterHourUsd: number | null
  planterHours: number | null
  /** The hour it becomes fit for its next pass in the middle run; null when fit now or not within the horizon. */
  fitAt: Instant | null
  /** The hour it is fit again after the rain, in the middle run that has rain. */
  fitAgainAt: Instant | null
  /** Stretches of the field's ground along the axis, in the middle run. */
  track: { from: Instant, to: Instant, ground: Ground }[]
  /** Water above the fit level of the seed zone, mm, in the middle run; 0 when at or under it. */
  aboveFitMm: number[]
  bars: Bar[]
  explain: Record<'ground' | 'doneBeforeRain' | 'atStake' | 'savedPerPlanterHour', Explanation> | null
}

export interface CoreChamber {
  /** Volumetric water now, the level at which it is fit, and the range drawn (empty to full), m³/m³. */
  water: number
  fit: number
  empty: number
  full: number
}

export interface PassProgress {
  pass: Pass
  state: 'done' | 'part' | 'to-do' | 'not-needed'
  doneAc: number
}

/** A chance counted over runs. `share` is the plotting position, never exactly 0 or 1. */
export interface Chance { share: number, count: number, of: number }

/** A quantity over the runs: mean, and the values that 1 in 10 and 9 in 10 stay under. US dollars. */
export interface Spread { meanUsd: number, lowUsd: number, highUsd: number }

export interface Bar {
  pass: Pass
  machineId: MachineId
  machine: string
  from: Instant
  to: Instant
  /** True when it starts after the early hour of the rain line, so that it may not come to pass. */
  afterRain: boolean
}

export interface MachineLane {
  id: MachineId
  name: string
  pass: Pass
  driver: string | null
  rateAcPerHour: number | null
  downUntil: Instant | null
  downReason: string | null
  bars: (Bar & { fieldId: FieldId, field: string })[]
}

export interface PlantedField { id: FieldId, name: string, areaAc: number, crop: string | null, plantedOn: LocalDay | null }

/** What a number was worked out from. */
export interface Explanation {
  rows: { label: string, quantity: Quantity, note?: string }[]
  /** Published method, one line each. */
  sources: string[]
  /** What the figure does not know. */
  unsure: string | null
}
export type Quantity
  = | { unit: 'usd' | 'usd/h' | 'ac' | 'ac/h' | 'h' | 'd' | 'mm' | 'c' | 'm3/m3' | 'share' | 'count' | 'bu/ac' | 'usd/bu', value: number | null }
    | { unit: 'instant', value: Instant | null }
    | { unit: 'text', value: string }
