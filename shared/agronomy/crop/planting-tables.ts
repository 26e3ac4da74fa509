import { calendarDay } from './calendar-day'

/** A published table of yield by planting date. */
export interface PlantingTable {
  /** what a crop's row in the database names */
  key: string
  crop: 'corn' | 'soybean' | 'wheat' | 'barley' | 'oats'
  title: string
  source: string
  /** calendar day (1 to 365) and percent of the highest yield, days rising */
  points: readonly (readonly [day: number, percent: number])[]
  /** True: the source charges nothing for planting before the first point. False: it says nothing about it. */
  fullBefore: boolean
}

const CORN_SOURCE = 'University of Minnesota Extension, Planting date considerations for corn'
const SOYBEAN_SOURCE = 'University of Minnesota Extension, Soybean planting date and delayed planting (Severson)'
const SMALL_GRAIN_SOURCE = 'NDSU Extension, loss per day by crop; University of Minnesota Extension, Table 1, weeks by zone'

const CORN_DAYS = [[4, 20], [4, 25], [4, 30], [5, 5], [5, 10], [5, 15], [5, 20], [5, 25], [5, 30], [6, 4], [6, 9]] as const
const CROOKSTON_DAYS = [[4, 25], [5, 2], [5, 9], [5, 26], [5, 30], [6, 5]] as const

function points(days: readonly (readonly [number, number])[], percents: readonly number[]): PlantingTable['points'] {
  return days.map(([month, day], index) => [calendarDay(month, day), percents[index]!] as const)
}

/** Percent lost per day after the optimum, NDSU. Applied in a straight line, not compounded: the source doesn't say which. */
export const SMALL_GRAIN_LOSS_PCT = { wheat: 1.5, barley: 1.7, oats: 1.2 } as const

/**
 * Weeks of the month in which small grains do best and in which they should at the latest be sown (UMN Table 1).
 * One web copy prints the second week of April as the last for the zone south of Minnesota 210; it is May.
 */
export const SMALL_GRAIN_ZONES = {
  'us-12': { name: 'south of US 12', optimum: { month: 4, week: 1 }, last: { month: 5, week: 1 } },
  'mn-210': { name: 'south of Minnesota 210 and North Dakota 13/21', optimum: { month: 4, week: 2 }, last: { month: 5, week: 2 } },
  'us-10': { name: 'south of US 10 and I-94', optimum: { month: 4, week: 3 }, last: { month: 5, week: 3 } },
  'us-2': { name: 'south of US 2', optimum: { month: 4, week: 4 }, last: { month: 5, week: 4 } },
  'canada': { name: 'from US 2 to Canada', optimum: { month: 5, week: 1 }, last: { month: 6, week: 1 } },
} as const
type SmallGrainZone = keyof typeof SMALL_GRAIN_ZONES

/** The last day of a week of the month: the source gives weeks, so the loss starts when the week is over. */
function endOfWeek({ month, week }: { month: number, week: number }): number {
  return calendarDay(month, 7 * week)
}

function smallGrain(crop: keyof typeof SMALL_GRAIN_LOSS_PCT, zone: SmallGrainZone): PlantingTable {
  const { name, optimum, last } = SMALL_GRAIN_ZONES[zone]
  const from = endOfWeek(optimum)
  const to = endOfWeek(last)
  return {
    key: `${crop}-${zone}`,
    crop,
    title: `${crop[0]!.toUpperCase()}${crop.slice(1)}, ${SMALL_GRAIN_LOSS_PCT[crop]} % a day after the best week, ${name}`,
    source: SMALL_GRAIN_SOURCE,
    points: [[from, 100], [to, 100 - SMALL_GRAIN_LOSS_PCT[crop] * (to - from)]],
    fullBefore: true,
  }
}

const ALL: readonly PlantingTable[] = [
  {
    key: 'corn-minnesota-1',
    crop: 'corn',
    title: 'Corn, Lamberton 1988–2003 (Potter & Quiring)',
    source: CORN_SOURCE,
    points: points(CORN_DAYS, [99, 100, 100, 99, 98, 95, 92, 87, 82, 76, 69]),
    fullBefore: false,
  },
  {
    key: 'corn-minnesota-2',
    crop: 'corn',
    title: 'Corn, Lamberton, Morris and Waseca 2009–2011',
    source: CORN_SOURCE,
    points: points(CORN_DAYS, [98, 99, 100, 100, 99, 98, 95, 92, 89, 84, 79]),
    fullBefore: false,
  },
  {
    // The table opens on 10 May at 100. The same service names about 1 May as the best date, so it is held back to that.
    key: 'soybean-minnesota',
    crop: 'soybean',
    title: 'Soybean, Minnesota',
    source: `${SOYBEAN_SOURCE}; best date from West Central Research and Outreach Center, Planting date`,
    points: points([[5, 1], [5, 10], [5, 20], [5, 30], [6, 10], [6, 20], [6, 30]], [100, 100, 97, 91, 82, 70, 57]),
    fullBefore: false,
  },
  {
    key: 'soybean-crookston-2007',
    crop: 'soybean',
    title: 'Soybean, Crookston 2007',
    source: SOYBEAN_SOURCE,
    points: points(CROOKSTON_DAYS, [100, 100, 100, 98, 90, 75]),
    fullBefore: false,
  },
  {
    key: 'soybean-crookston-2008',
    crop: 'soybean',
    title: 'Soybean, Crookston 2008',
    source: SOYBEAN_SOURCE,
    points: points(CROOKSTON_DAYS, [100, 98, 96, 92, 87, 81]),
    fullBefore: false,
  },
  ...(['wheat', 'barley', 'oats'] as const).flatMap(crop =>
    (Object.keys(SMALL_GRAIN_ZONES) as SmallGrainZone[]).map(zone => smallGrain(crop, zone))),
]

/** Every table by its key. */
export const PLANTING_TABLES: ReadonlyMap<string, PlantingTable> = new Map(ALL.map(table => [table.key, table]))
