import { PASSES } from '../../../shared/agronomy/ground'
import type { StretchLists } from '../../../shared/agronomy/plan/problem'
import { closeSprayHours } from '../../../shared/agronomy/plan/spray-hours'
import { fitAgainAt, StretchListBuilder } from '../../../shared/agronomy/plan/workable'
import type { FieldSoil } from '../../../shared/agronomy/soil/field-soil'
import { createFitMarks, markFitHours, type FitMarks } from '../../../shared/agronomy/soil/fit'
import { copyState, createTrace, runFieldModel, startingState, type FieldState, type FieldTrace } from '../../../shared/agronomy/soil/water-balance'
import type { PlaceWork } from './place-work'

/** What a crop asks of the ground. */
export interface CropNeeds { minimumSoilC: number, chillHours: number }

/** What the soil model says about ground that several fields may share. */
export interface Ground {
  soil: FieldSoil
  /** at the end of the past: m³/m³, °C */
  now: { seedZoneWater: number, belowWater: number, seedMeanC: number }
  workable: StretchLists
  /** hour in which the ground is fit to plant again after each run's rain; Infinity: not within the spell, or no rain */
  fitAgainAt: Float64Array
  /** in the middle run: flags hour by hour, and water above the fit level of the seed zone, mm */
  middle: { marks: FitMarks, aboveFitMm: Float64Array }
}

/** Arrays that the model writes to, made once for a farm. */
export interface Scratch { pastTrace: FieldTrace, trace: FieldTrace, marks: FitMarks, aheadTraces: Map<number, FieldTrace> }

export function createScratch(pastHours: number, aheadHours: number): Scratch {
  return { pastTrace: createTrace(pastHours), trace: createTrace(aheadHours), marks: createFitMarks(aheadHours), aheadTraces: new Map() }
}

const SEED_ZONE_MM = 100

/**
 * Runs one soil at one place through the past once and then through every run, and reads off the ground for each of
 * the crops that stand on it. Ground that is still wet when a run ends dries on in the ordinary dry spell.
 *
 * @param needs - one element for each kind of crop on this soil here
 * @param middle - index of the run that is drawn
 * @param hours - horizon of the order
 * @returns one ground for each element of `needs`
 */
export function groundsOf(soil: FieldSoil, place: PlaceWork, needs: readonly CropNeeds[], middle: number, hours: number, scratch: Scratch): Ground[] {
  const state = startingState(soil)
  const now = runPast(soil, place, state, scratch)
  const readings = needs.map((need): Reading => ({ need, builder: new StretchListBuilder(), fitAgainAt: new Float64Array(place.runs.length).fill(Infinity), middle: null }))
  const inRun = startingState(soil)
  for (let run = 0; run < place.runs.length; run++) {
    copyState(state, inRun)
    runAhead(soil, place, run, inRun, scratch)
    for (const reading of readings) {
      mark(soil, place, reading, scratch)
      closeSprayHours(scratch.marks.spray, place.runs[run]!.weather)
      for (const pass of PASSES) reading.builder.add(scratch.marks[pass], scratch.trace.rainMm, place.rainAt[run]!, 0, hours)
      if (run === middle) reading.middle = draw(soil, scratch, hours)
      reading.fitAgainAt[run] = againIn(place, run, scratch)
    }
    if (place.rainAt[run] === Infinity || readings.every(reading => reading.fitAgainAt[run]! < Infinity)) continue
    dryOn(soil, place, inRun, scratch)
    for (const reading of readings) {
      mark(soil, place, reading, scratch)
      reading.fitAgainAt[run] = againIn(place, run, scratch)
    }
  }
  return readings.map(({ builder, fitAgainAt, middle: drawn }) => ({ soil, now, workable: builder.build(), fitAgainAt, middle: drawn! }))
}

/** What is read off the model for one kind of crop, run by run. */
interface Reading { need: CropNeeds, builder: StretchListBuilder, fitAgainAt: Float64Array, middle: Ground['middle'] | null }

function runPast(soil: FieldSoil, { past }: PlaceWork, state: FieldState, { pastTrace }: Scratch): Ground['now'] {
  const last = past.weather.hours - 1
  pastTrace.hours = past.weather.hours
  runFieldModel(soil, past.weather, past.etoMm, past.localHour, state, pastTrace)
  return { seedZoneWater: pastTrace.water1[last]!, belowWater: pastTrace.water2[last]!, seedMeanC: pastTrace.seedMeanC[last]! }
}

function runAhead(soil: FieldSoil, { runs, runHours }: PlaceWork, run: number, state: FieldState, { trace }: Scratch): void {
  const { weather, etoMm, localHour } = runs[run]!
  trace.hours = runHours
  runFieldModel(soil, weather, etoMm, localHour, state, trace)
}

function mark(soil: FieldSoil, { ahead }: PlaceWork, { need }: Reading, { trace, marks }: Scratch): void {
  markFitHours(soil, trace, ahead.hourOfDay, need.minimumSoilC, marks, need.chillHours)
}

function againIn({ rainAt }: PlaceWork, run: number, { marks, trace }: Scratch): number {
  return rainAt[run]! < Infinity ? fitAgainAt(marks.plant, trace.rainMm, rainAt[run]!, 0, trace.hours) : Infinity
}

/** Carries the run on through the dry spell, behind its own hours in the same trace. */
function dryOn(soil: FieldSoil, { spell, runHours }: PlaceWork, state: FieldState, scratch: Scratch): void {
  let rest = scratch.aheadTraces.get(runHours)
  if (!rest) scratch.aheadTraces.set(runHours, rest = traceFrom(scratch.trace, runHours, spell.weather.hours))
  runFieldModel(soil, spell.weather, spell.etoMm, spell.localHour, state, rest)
  scratch.trace.hours = runHours + spell.weather.hours
}

/** The part of a trace behind an hour, in the same memory. */
function traceFrom(trace: FieldTrace, from: number, hours: number): FieldTrace {
  return {
    hours,
    water1: trace.water1.subarray(from),
    water2: trace.water2.subarray(from),
    temperature5C: trace.temperature5C.subarray(from),
    temperature10C: trace.temperature10C.subarray(from),
    seedMeanC: trace.seedMeanC.subarray(from),
    snowMm: trace.snowMm.subarray(from),
    pondMm: trace.pondMm.subarray(from),
    rainMm: trace.rainMm.subarray(from),
    frostIndex: trace.frostIndex.subarray(from),
    frozen: trace.frozen.subarray(from),
    seedZoneFit: trace.seedZoneFit.subarray(from),
    tillageFit: trace.tillageFit.subarray(from),
    carries: trace.carries.subarray(from),
    surfaceDry: trace.surfaceDry.subarray(from),
  }
}

/** Keeps what is drawn of the middle run. */
function draw(soil: FieldSoil, { trace, marks }: Scratch, hours: number): Ground['middle'] {
  const cut = (flags: Uint8Array) => flags.slice(0, hours)
  return {
    marks: { hours, dig: cut(marks.dig), rocks: cut(marks.rocks), plant: cut(marks.plant), roll: cut(marks.roll), spray: cut(marks.spray), frozen: cut(marks.frozen), cold: cut(marks.cold) },
    aboveFitMm: Float64Array.from({ length: hours }, (_, hour) => Math.max(0, (trace.water1[hour]! - soil.fitWater) * SEED_ZONE_MM)),
  }
}
