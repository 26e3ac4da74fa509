import { PASSES } from '../../../shared/agronomy/ground'
import { greatCircleKm } from '../../../shared/agronomy/machine/road'
import { plottingPosition, quantileByRank } from '../../../shared/agronomy/plan/chance'
import { acresBy } from '../../../shared/agronomy/plan/leave-undug'
import { PASS_COUNT, PLANT } from '../../../shared/agronomy/plan/problem'
import { reason, type ReasonFacts, type Say } from '../../../shared/agronomy/plan/reason'
import type { Ground as GroundWord } from '../../../shared/agronomy/ground'
import type { GroundRow, RainLine, Spread } from '../../../shared/types/ground-order'
import { barsOf } from './bars'
import { explainRanked } from './explain'
import { groundPart, nextPass } from './ground-part'
import { groundWords } from './ground-track'
import { hourOfWaiting, type OrderPlan } from './order-plan'

/** Fields whose middles are no further apart than this lie side by side, km. A design choice for sections and quarters. */
const NEXT_DOOR_KM = 1.2
/** Hours by which fields must differ in when they are fit again before one is called slow or quick. A design choice. */
const TELLING_HOURS = 24

/** What the rows of one order share. */
export interface RowContext { plan: OrderPlan, rainLine: RainLine, medianHour: number | null, earlyHour: number | null, middle: number, at: (hour: number) => string, say: Say }

/** The ranked fields, in their order. */
export function rankedRows(context: RowContext): GroundRow[] {
  const { plan } = context
  const again = plan.fields.map(({ known, ground }) => mean(ground.fitAgainAt.map((hour, run) => hourOfWaiting(known, hour, run, plan.problem.hours))))
  return plan.list.map((field, index) => rankedRow(context, field, index, again))
}

function rankedRow(context: RowContext, field: number, index: number, again: readonly number[]): GroundRow {
  const { plan, rainLine, at } = context
  const { known, ground } = plan.fields[field]!
  const atStake = spread(plan.stakes[field]!)
  const saved = savedPerHour(plan, field)
  return {
    ...groundPart(known, ground, context),
    rank: index + 1,
    reason: reason(reasonFacts(context, field, index, again), context.say),
    beforeRain: !plan.unlikely.has(field),
    doneBeforeRain: { share: plottingPosition(plan.figures.doneRuns[field]!, plan.problem.runs), count: plan.figures.doneRuns[field]!, of: plan.problem.runs },
    atStake,
    savedPerPlanterHourUsd: saved,
    planterHours: plan.planterHours[field]!,
    bars: barsOf(field, plan.drawn, plan.machines, at, context.earlyHour),
    explain: explainRanked(plan, field, atStake, rainLine, at),
  }
}

function savedPerHour({ figures, lastUsd, planterHours }: OrderPlan, field: number): number | null {
  const usd = (figures.worthUsd[field]! - lastUsd[field]!) / planterHours[field]!
  return Number.isNaN(usd) ? null : usd
}

function spread(stakes: Float64Array): Spread | null {
  if (stakes.some(Number.isNaN)) return null
  return { meanUsd: mean(stakes), lowUsd: quantileByRank(stakes, 0.1), highUsd: quantileByRank(stakes, 0.9) }
}

function mean(values: ArrayLike<number>): number {
  let sum = 0
  for (let i = 0; i < values.length; i++) sum += values[i]!
  return sum / values.length
}

function reasonFacts(context: RowContext, field: number, index: number, again: readonly number[]): ReasonFacts {
  const { plan, medianHour } = context
  const { known, ground } = plan.fields[field]!
  const words = groundWords(ground.middle.marks, nextPass(known))
  const likely = plan.list.filter(other => !plan.unlikely.has(other))
  const tells = likely.length > 1 && Math.max(...likely.map(other => again[other]!)) - Math.min(...likely.map(other => again[other]!)) >= TELLING_HOURS
  const before = plan.list[index - 1]
  return {
    ground: words[0]!,
    inField: inField(plan, field, context.middle),
    fitAt: firstFit(words),
    rainAt: medianHour,
    planter: plan.machines[plan.assignment.machineOf[field * PASS_COUNT + PLANT]!]?.name ?? null,
    planterHours: plan.planterHours[field]!,
    cropName: known.crop!.name.toLowerCase(),
    seedZoneC: ground.now.seedMeanC,
    minimumSoilC: known.needs.minimumSoilC,
    likely: !plan.unlikely.has(field),
    savedPerPlanterHourUsd: savedPerHour(plan, field),
    atStakeUsd: spread(plan.stakes[field]!)?.meanUsd ?? null,
    plantedByRainAc: plan.problem.fields[field]!.doneAc[PLANT]! + acresBy(plan.drawn, field * PASS_COUNT + PLANT, medianHour ?? Infinity),
    areaAc: known.season.field.areaAc,
    wouldLieOpen: plan.held.has(field),
    savesMost: plan.list.every(other => (savedPerHour(plan, other) ?? -Infinity) <= (savedPerHour(plan, field) ?? -Infinity)),
    staysWetLongest: tells && likely.every(other => again[other]! <= again[field]!),
    driesFirst: tells && index >= likely.length / 2 && likely.every(other => again[other]! >= again[field]!),
    nextDoorTo: before !== undefined && isNextDoor(plan, before, field) ? plan.fields[before]!.known.season.field.name : null,
  }
}

/** Hour at which ground that isn't fit now becomes so; null when it is, or isn't within the horizon. */
export function firstFit(words: readonly GroundWord[]): number | null {
  const hour = words.indexOf('fit')
  return hour > 0 ? hour : null
}

function isNextDoor({ fields }: OrderPlan, one: number, other: number): boolean {
  return greatCircleKm(fields[one]!.known.season.field, fields[other]!.known.season.field) <= NEXT_DOOR_KM
}

/** The machine of the furthest pass that is part done, when it stands in the field. */
function inField({ fields, machines, drawn, problem }: OrderPlan, field: number, middle: number): ReasonFacts['inField'] {
  const { season } = fields[field]!.known
  for (let pass = PASSES.length - 1; pass >= 0; pass--) {
    const doneAc = problem.fields[field]!.doneAc[pass]!
    if (!season.needed[pass] || doneAc === 0 || doneAc >= season.field.areaAc) continue
    const machine = machines.find(row => row.pass === PASSES[pass] && row.atFieldId === season.field.id)
    const finishedAt = drawn.finishedAt[field * PASS_COUNT + pass]!
    const rainAt = problem.rainAt[problem.fields[field]!.ground * problem.runs + middle]!
    if (machine) return { machine: machine.name, areaLeftAc: season.field.areaAc - doneAc, doneAt: finishedAt <= rainAt && Number.isFinite(finishedAt) ? finishedAt : null }
  }
  return null
}
