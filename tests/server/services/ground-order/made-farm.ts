import type { FarmInputs, UsableWeather } from '../../../../server/services/ground-order/farm-inputs'
import type { HourlyWeather } from '../../../../shared/agronomy/weather/hourly'
import type { CropId, FarmId, FieldId, MachineId, PlaceId, SoilId } from '../../../../shared/types/ids'

export const NOW = new Date('2025-05-06T10:20:00Z')
/** Unix seconds of the hour that NOW lies in. */
export const STARTS_AT = Date.UTC(2025, 4, 6, 10) / 1000
const PAST_HOURS = 60 * 24
const farmId = 'made' as FarmId
export const PLACE = 'here' as PlaceId
export const THERE = 'there' as PlaceId

/** Mild dry spring days, the same every day at the farm's clock, with rain where it is asked for. */
function hourly(startsAt: number, hours: number, rainMm: (hour: number) => number): HourlyWeather {
  const clock = (hour: number) => ((startsAt / 3600 + hour - 5) % 24 + 24) % 24
  const sun = (hour: number) => Math.max(0, Math.sin((clock(hour) - 6) / 14 * Math.PI))
  const column = (value: (hour: number) => number) => Float64Array.from({ length: hours }, (_, hour) => value(hour))
  return {
    startsAt,
    hours,
    rainMm: column(rainMm),
    temperatureC: column(hour => 14 + 5 * Math.sin((clock(hour) - 9) / 24 * 2 * Math.PI)),
    humidityPct: column(() => 60),
    windMs: column(() => 4),
    radiationWm2: column(hour => 650 * sun(hour)),
  }
}

/**
 * Weather of one place.
 *
 * @param rainAt - for each run the hour in which 3 mm an hour begin, for eight hours; Infinity: a dry run
 * @param wetDaysAgo - days since the last 25 mm fell
 */
export function madeWeather(rainAt: readonly number[], wetDaysAgo = 8, hours = 157): UsableWeather {
  const runs = rainAt.map(from => hourly(STARTS_AT, hours, hour => hour >= from && hour < from + 8 ? 3 : 0))
  const wet = PAST_HOURS - wetDaysAgo * 24
  return {
    past: hourly(STARTS_AT - PAST_HOURS * 3600, PAST_HOURS, hour => hour >= wet && hour < wet + 5 ? 5 : 0),
    forecast: { ...runs[0]!, gustMs: new Float64Array(hours).fill(7), windDirectionDeg: new Float64Array(hours).fill(180) },
    runs,
    issuedAt: new Date('2025-05-06T09:40:00Z'),
    fetchedAt: new Date('2025-05-06T09:41:00Z'),
    elevationM: 275,
  }
}

type Field = FarmInputs['fields'][number]
export function madeField(name: string, over: Partial<Field> = {}): Field {
  return {
    id: name.toLowerCase().replace(/\W+/g, '-') as FieldId, farmId, name, areaAc: 160, latitude: 46.9, longitude: -96.8, placeId: PLACE, soilId: 'loam' as SoilId, cropId: 'corn' as CropId,
    drainage: 'tiled', residuePct: 20, chain: ['dig', 'plant'], createdAt: NOW, ...over,
  }
}

type Machine = FarmInputs['machines'][number]
export function madeMachine(name: string, pass: Machine['pass'], over: Partial<Machine> = {}): Machine {
  return {
    id: name.toLowerCase() as MachineId, farmId, name, pass, driver: null, widthFt: 60, speedMph: 5.5, fieldEfficiency: 0.7, fromHour: 6, toHour: 21, foldMinutes: 10, roadMph: 15,
    atFieldId: null, downUntil: null, downReason: null, ...over,
  }
}

/** A farm whose three runs have rain in 50 to 60 hours, with a digger, a planter and the fields that are given. */
export function madeFarm(over: Partial<FarmInputs> = {}): FarmInputs {
  const crop = (id: string, name: string, kind: 'corn' | 'soybean' | 'wheat', plantingTable: string, minimumSoilC: number) =>
    ({ id: id as CropId, farmId, name, kind, plantingTable, minimumSoilC, goalYieldBuPerAc: 180, priceUsdPerBu: 4.3 })
  const soil = (id: string, name: string, sandPct: number, clayPct: number) => ({ id: id as SoilId, farmId, name, sandPct, clayPct, organicMatterPct: 3 })
  return {
    farm: { id: farmId, slug: 'made', name: 'Made Farm', zone: 'America/Chicago', units: 'us', latitude: 46.9, longitude: -96.8, invented: true, revision: 1 },
    now: NOW,
    fields: [madeField('North'), madeField('South')],
    soils: [soil('loam', 'Loam', 40, 20), soil('clay', 'Clay', 25, 50), soil('sandy', 'Sandy loam', 65, 10)],
    crops: [crop('corn', 'Corn', 'corn', 'corn-minnesota-1', 5), crop('cold-corn', 'Corn', 'corn', 'corn-minnesota-1', 25), crop('wheat', 'Wheat', 'wheat', 'wheat-us-2', 4)],
    machines: [madeMachine('Badger', 'dig'), madeMachine('Jay', 'plant')],
    passTotals: [],
    places: [{ id: PLACE, latitude: 46.9, longitude: -96.8 }, { id: THERE, latitude: 47.1, longitude: -96.8 }],
    weather: new Map([[PLACE, madeWeather([50, 55, 60])]]),
    forecast: {
      status: 'fresh', issuedAt: '2025-05-06T09:40:00.000Z', fetchedAt: '2025-05-06T09:41:00.000Z', runs: 3, source: 'made', invented: true, trouble: null,
      attribution: { text: 'Made', href: 'https://made.example/', licence: 'none' },
    },
    ...over,
  }
}
