import { middleRun, rainLine, type RainOnset } from '../../../shared/agronomy/plan/rain-line'
import { RAIN_THRESHOLD_MM } from '../../../shared/agronomy/plan/rain-onset'
import { PASSES } from '../../../shared/agronomy/ground'
import type { GroundOrder, GroundRow, MachineLane, PlantedField, RainLine } from '../../../shared/types/ground-order'
import type { FarmInputs } from './farm-inputs'
import { farmPlaces, HORIZON_HOURS, type FarmPlaces } from './farm-places'
import { createScratch, groundsOf, type Ground } from './field-ground'
import { fieldSeason, isPlanted, type FieldSeason } from './field-season'
import { unknownRow, unrankedRow } from './ground-part'
import { localHours } from './local-hours'
import { passesWithoutMachine, rateOf, whatMachineMisses } from './machine-hours'
import { orderPlan } from './order-plan'
import { PAST_HOURS, SPELL_HOURS } from './place-work'
import { isKnown, lookUpField, NOTHING_TO_PLANT, type KnownField } from './rankable'
import { rankedRows } from './ranked-rows'
import { ribbon } from './ribbon'
import { sayFor } from './say'
import { sayNames } from './words'

/** Works out a farm's Ground order. The same inputs give the same answer, to the byte, in whatever order they come. */
export function workOutOrder(given: FarmInputs): GroundOrder {
  const inputs = { ...given, fields: byId(given.fields), machines: byId(given.machines) }
  const { farm, now } = inputs
  const startsAt = Math.floor(now.getTime() / 3_600_000) * 3600
  const at = (hour: number) => new Date(Math.round((startsAt + hour * 3600) * 1000)).toISOString()
  const seasons = inputs.fields.map(field => fieldSeason(field, inputs.passTotals))
  const places = farmPlaces(inputs, startsAt)
  const onset = places.reference && rainOf(places)
  const line = sayRainLine(onset, at)
  const rows = orderRows(inputs, seasons, places, onset, line, startsAt, at)
  return {
    farm: { slug: farm.slug, name: farm.name, zone: farm.zone, units: farm.units, invented: farm.invented },
    now: now.toISOString(),
    axis: { startsAt: at(0), hours: places.reference ? places.hours : HORIZON_HOURS },
    forecast: inputs.forecast,
    rainLine: line,
    ribbon: places.reference && onset && ribbon(places.reference, farm, farm.zone, places.hours, onset.middle),
    rows,
    planted: plantedFields(inputs, seasons),
    machines: machineLanes(inputs, rows),
    totals: {
      areaLeftAc: rows.reduce((acres, row) => acres + row.areaAc - row.chain[PASSES.indexOf('plant')]!.doneAc, 0),
      atStakeUsd: totalStake(rows),
    },
    missing: missingWords(inputs, seasons, rows),
  }
}

function byId<Row extends { id: string }>(rows: readonly Row[]): Row[] {
  return [...rows].sort((a, b) => a.id < b.id ? -1 : 1)
}

function rainOf({ reference, hours }: FarmPlaces): RainOnset & { middle: number } {
  const rain = reference!.runs.map(run => run.weather.rainMm)
  return { ...rainLine(rain, reference!.rainAt), middle: middleRun(rain, reference!.rainAt.map(hour => hour < hours ? hour : Infinity)) }
}

function sayRainLine(onset: RainOnset | null, at: (hour: number) => string): RainLine {
  const when = (hour: number | null | undefined) => hour === null || hour === undefined ? null : at(hour)
  return {
    status: onset === null ? 'not-known' : onset.medianHour === null ? 'none-in-horizon' : 'known',
    medianAt: when(onset?.medianHour),
    earlyAt: when(onset?.earlyHour),
    lateAt: when(onset?.lateHour),
    share: onset?.share ?? null,
    likelyMm: onset?.likelyMm ?? null,
    thresholdMm: RAIN_THRESHOLD_MM,
  }
}

/** Ranked fields first, then those that can't be ranked, by name. */
function orderRows(
  inputs: FarmInputs, seasons: readonly FieldSeason[], places: FarmPlaces, onset: ReturnType<typeof rainOf> | null,
  line: RainLine, startsAt: number, at: (hour: number) => string,
): GroundRow[] {
  const open = seasons.filter(season => !isPlanted(season) && season.next !== null)
  const noMachine = passesWithoutMachine(inputs.machines, new Set(PASSES))
  const looked = open.map(season => lookUpField(season, inputs, places.works, noMachine))
  const known = looked.filter(isKnown)
  const unknown = looked.flatMap(field => isKnown(field) ? [] : [unknownRow(field)])
  if (known.length === 0 || !onset) return byName(unknown)
  const grounds = groundOf(known, places, onset.middle)
  const planned = known.filter(field => field.unranked === null).map(field => ({ known: field, ground: grounds.get(field)! }))
  const unranked = known.filter(field => field.unranked !== null).map(field => unrankedRow(field, grounds.get(field)!, { middle: onset.middle, at }))
  if (planned.length === 0) return byName([...unranked, ...unknown])
  const plan = orderPlan(planned, inputs.fields, inputs.machines, startsAt, places.hours, onset.middle)
  const ranked = rankedRows({ plan, rainLine: line, medianHour: onset.medianHour, earlyHour: onset.earlyHour, middle: onset.middle, at, say: sayFor(inputs.farm, startsAt) })
  return [...ranked, ...byName([...unranked, ...unknown])]
}

function byName(rows: GroundRow[]): GroundRow[] {
  return rows.sort((a, b) => a.name.localeCompare(b.name, 'en'))
}

/** Runs the soil model once for all fields that are alike in place, soil, drainage and residue. */
function groundOf(known: readonly KnownField[], places: FarmPlaces, middle: number): Map<KnownField, Ground> {
  const scratch = createScratch(Math.max(PAST_HOURS, ...known.map(({ place }) => place.past.weather.hours)), Math.max(...known.map(({ place }) => place.runHours)) + SPELL_HOURS)
  const alike = new Map<string, KnownField[]>()
  for (const field of known) {
    const { field: row } = field.season
    const key = JSON.stringify([row.placeId, field.soilRow.id, row.drainage, row.residuePct])
    alike.set(key, [...alike.get(key) ?? [], field])
  }
  const grounds = new Map<KnownField, Ground>()
  for (const fields of alike.values()) {
    const needs = [...new Map(fields.map(field => [JSON.stringify(field.needs), field.needs])).values()]
    const made = groundsOf(fields[0]!.soil, fields[0]!.place, needs, middle, places.hours, scratch)
    for (const field of fields) grounds.set(field, made[needs.findIndex(need => JSON.stringify(need) === JSON.stringify(field.needs))]!)
  }
  return grounds
}

function plantedFields({ crops, farm }: FarmInputs, seasons: readonly FieldSeason[]): PlantedField[] {
  return seasons.filter(isPlanted).map(({ field, plantedAt }) => ({
    id: field.id,
    name: field.name,
    areaAc: field.areaAc,
    crop: crops.find(crop => crop.id === field.cropId)?.name ?? null,
    plantedOn: plantedAt && localHours(plantedAt.getTime() / 1000, 1, farm.zone).localDay[0]!,
  }))
}

function machineLanes({ machines, now }: FarmInputs, rows: readonly GroundRow[]): MachineLane[] {
  return [...machines].sort((a, b) => PASSES.indexOf(a.pass) - PASSES.indexOf(b.pass) || a.name.localeCompare(b.name, 'en')).map((machine) => {
    const down = machine.downUntil !== null && machine.downUntil > now
    return {
      id: machine.id,
      name: machine.name,
      pass: machine.pass,
      driver: machine.driver,
      rateAcPerHour: rateOf(machine),
      downUntil: down ? machine.downUntil!.toISOString() : null,
      downReason: down ? machine.downReason : null,
      bars: rows.flatMap(row => row.bars.filter(bar => bar.machineId === machine.id).map(bar => ({ ...bar, fieldId: row.id, field: row.name })))
        .sort((a, b) => a.from.localeCompare(b.from)),
    }
  })
}

function totalStake(rows: readonly GroundRow[]): number | null {
  const known = rows.flatMap(row => row.atStake ? [row.atStake.meanUsd] : [])
  return known.length > 0 ? known.reduce((sum, usd) => sum + usd, 0) : null
}

/** One plain sentence for each thing that keeps the order from being whole. */
function missingWords({ machines, forecast }: FarmInputs, seasons: readonly FieldSeason[], rows: readonly GroundRow[]): string[] {
  const wanted = new Set(seasons.flatMap(({ field, next }) => next === null ? [] : field.chain))
  const noMachine = [...passesWithoutMachine(machines, wanted).values()]
  const fields = new Map<string, string[]>()
  for (const { rank, reason, name } of rows) {
    if (rank === null && reason !== NOTHING_TO_PLANT && !noMachine.includes(reason)) fields.set(reason, [...fields.get(reason) ?? [], name])
  }
  return [
    ...(forecast.trouble ? [forecast.trouble] : []),
    ...machines.flatMap(machine => whatMachineMisses(machine) ?? []),
    ...noMachine.map(sentence => `${sentence}.`),
    ...[...fields].map(([reason, names]) => `${sayNames(names)}: ${reason}.`),
  ]
}
