import { LEAD_AC, LEAD_SHARE } from '../../../shared/agronomy/plan/work-pass'
import { PASS_COUNT, PLANT } from '../../../shared/agronomy/plan/problem'
import { SOIL_SETTINGS } from '../../../shared/agronomy/soil/settings'
import { PASSES } from '../../../shared/agronomy/ground'
import type { Explanation, GroundRow, Quantity, RainLine, Spread } from '../../../shared/types/ground-order'
import type { Ground } from './field-ground'
import { rateOf } from './machine-hours'
import { hourOfWaiting, type OrderPlan } from './order-plan'
import type { KnownField } from './rankable'

const quantity = (unit: Exclude<Quantity['unit'], 'instant' | 'text'>, value: number | null): Quantity => ({ unit, value: value === null || Number.isNaN(value) ? null : value })
const instant = (value: string | null): Quantity => ({ unit: 'instant', value })
const text = (value: string): Quantity => ({ unit: 'text', value })

/** Where a ranked field's four numbers come from. */
export function explainRanked(plan: OrderPlan, field: number, atStake: Spread | null, rainLine: RainLine, at: (hour: number) => string): NonNullable<GroundRow['explain']> {
  return {
    ground: explainGround(plan.fields[field]!.known, plan.fields[field]!.ground),
    doneBeforeRain: explainChance(plan, field, rainLine, at),
    atStake: explainStake(plan, field, atStake),
    savedPerPlanterHour: explainSaved(plan, field),
  }
}

export function explainGround({ season, soilRow, crop, place }: KnownField, { soil, now }: Ground): Explanation {
  const { weather } = place
  return {
    rows: [
      { label: 'Water, seed zone', quantity: quantity('m3/m3', now.seedZoneWater), note: 'top 100 mm (4 in), end of the last hour' },
      { label: 'Fit at or under', quantity: quantity('m3/m3', soil.fitWater) },
      { label: 'Water, below', quantity: quantity('m3/m3', now.belowWater), note: '100 to 300 mm (4 to 12 in)' },
      { label: 'Tillable at or under', quantity: quantity('m3/m3', soil.belowFitWater) },
      { label: 'Soil at seed depth', quantity: quantity('c', now.seedMeanC), note: `mean of ${SOIL_SETTINGS.seedMeanHours.value} hours at 50 mm (2 in)` },
      { label: 'Planted from', quantity: quantity('c', crop?.minimumSoilC ?? null), note: crop?.name },
      { label: 'Soil', quantity: text(`${soilRow.name}: ${soilRow.sandPct} % sand, ${soilRow.clayPct} % clay, ${soilRow.organicMatterPct} % organic matter`) },
      { label: 'Drainage', quantity: text(season.field.drainage === 'tiled' ? 'tiled' : `${season.field.drainage.replace('-poor', ' poorly').replace('poor', 'poorly')} drained`) },
      { label: 'Residue', quantity: quantity('share', season.field.residuePct / 100) },
      { label: 'Past weather to', quantity: instant(new Date((weather.past.startsAt + weather.past.hours * 3600) * 1000).toISOString()) },
      { label: 'Forecast issued', quantity: instant(weather.issuedAt?.toISOString() ?? null) },
    ],
    sources: [
      'Water: hourly balance of three layers; FAO-56 (Allen et al. 1998), Saxton & Rawls 2006, NRCS NEH-630',
      'Fit level: Rutledge & McHardy 1968; Devine et al. 2022; Dexter & Bird 2001',
      'Warmth: NDSU and Manitoba minimum soil temperatures',
    ],
    unsure: 'Soil figures are of the survey’s texture, not of this field; the wet holes in it are wetter than the field. A soil check by hand beats this.',
  }
}

function explainChance(plan: OrderPlan, field: number, rainLine: RainLine, at: (hour: number) => string): Explanation {
  const { problem, figures, assignment, machines, drawn, fields } = plan
  const { season } = fields[field]!.known
  const work = PASSES.slice(0, PLANT + 1).flatMap((pass, index) => {
    const machine = machines[assignment.machineOf[field * PASS_COUNT + index]!]
    if (!machine) return []
    return [{ label: `${machine.name}, ${pass}`, quantity: quantity('ac/h', rateOf(machine)), note: `${Math.round(season.field.areaAc - season.doneAc[index]!)} ac left` }]
  })
  const finishedAt = drawn.finishedAt[field * PASS_COUNT + PLANT]!
  return {
    rows: [
      { label: 'Runs in which it is planted before rain', quantity: quantity('count', figures.doneRuns[field]!), note: `of ${problem.runs}` },
      { label: 'Rain line', quantity: instant(rainLine.medianAt), note: 'half of the runs have started' },
      { label: 'Early', quantity: instant(rainLine.earlyAt), note: '1 run in 10' },
      { label: 'Late', quantity: instant(rainLine.lateAt), note: '9 runs in 10' },
      { label: 'Planted in the middle run', quantity: instant(Number.isFinite(finishedAt) ? at(finishedAt) : null) },
      ...work,
      ...(plan.held.has(field) ? [{ label: 'Order', quantity: text('The order leaves it undug until the rain; the chance is as if it were worked in its turn') }] : []),
    ],
    sources: [
      'Chance: (runs + 1/3) ÷ (all runs + 2/3), never 0 or 1',
      'Acres an hour: ASABE EP496; Iowa State A3-24',
      `A pass starts ${LEAD_AC} ac or ${LEAD_SHARE * 100} % of the field behind the one before, whichever is less, and never overtakes it`,
    ],
    unsure: 'Breakdowns, seed that runs out and people who stop early are not in it. In a run without rain, done means within the five days.',
  }
}

function explainStake(plan: OrderPlan, field: number, atStake: Spread | null): Explanation {
  const { fields, problem } = plan
  const { known, ground } = fields[field]!
  const { season, crop, table } = known
  const planned = problem.fields[field]!
  const wait = ground.fitAgainAt.reduce((sum, again, run) => sum + hourOfWaiting(known, again, run, problem.hours), 0) / problem.runs / 24
  const after = planned.shareAfter.reduce((sum, share) => sum + share, 0) / problem.runs
  return {
    rows: [
      { label: 'Acres to plant', quantity: quantity('ac', season.field.areaAc - season.doneAc[PLANT]!) },
      { label: 'Yield kept if planted today', quantity: quantity('share', planned.shareByHour[0]!), note: table?.title },
      { label: 'Yield kept by waiting', quantity: quantity('share', after), note: 'mean over the runs' },
      { label: 'Days until fit again', quantity: quantity('d', wait), note: 'mean over the runs, at the least' },
      { label: 'Goal', quantity: quantity('bu/ac', crop?.goalYieldBuPerAc ?? null) },
      { label: 'Price', quantity: quantity('usd/bu', crop?.priceUsdPerBu ?? null) },
      { label: 'Stays under in 1 run of 10', quantity: quantity('usd', atStake?.lowUsd ?? null) },
      { label: 'Stays under in 9 runs of 10', quantity: quantity('usd', atStake?.highUsd ?? null) },
      { label: 'At stake by waiting', quantity: quantity('usd', atStake?.meanUsd ?? null), note: 'mean over the runs' },
    ],
    sources: table ? [`Yield by planting date: ${table.source}`] : [],
    unsure: 'Behind the end of the runs the ground dries by the place’s ordinary dry day, so more rain makes the wait longer. A run in which it can’t be planted before rain counts as nothing at stake; a run without rain as a wait to the end of the five days. The table knows no hybrid and no field.',
  }
}

function explainSaved(plan: OrderPlan, field: number): Explanation {
  const { figures, lastUsd, planterHours } = plan
  const saved = figures.worthUsd[field]! - lastUsd[field]!
  return {
    rows: [
      { label: 'Kept by going in its turn', quantity: quantity('usd', figures.worthUsd[field]!), note: 'acres planted before rain, mean over the runs' },
      { label: 'Kept by going last', quantity: quantity('usd', lastUsd[field]!) },
      { label: 'Saved by its turn', quantity: quantity('usd', saved) },
      { label: 'Planter hours it needs', quantity: quantity('h', planterHours[field]!) },
      { label: 'Saved per planter hour', quantity: quantity('usd/h', saved / planterHours[field]!) },
    ],
    sources: ['The best of five quick orders: by what a planter hour saves, with the planter or every machine kept busy; most money first; nearest first; driest first'],
    unsure: 'It is no search: a better order may exist. Ground that isn’t fit yet may stand behind ground that saves less. Fuel and road hours aren’t charged.',
  }
}
