import type { Ground } from '../ground'

/**
 * Why a field stands where it stands, in one line of plain words.
 *
 * Hours count from the start of the plan; null: not within the horizon, or not so.
 */
export interface ReasonFacts {
  ground: Ground
  /** machine that is in the field with acres of its pass done and acres left, and when it is through in the middle run */
  inField: { machine: string, areaLeftAc: number, doneAt: number | null } | null
  /** hour at which it is fit for its next work, when it isn't now */
  fitAt: number | null
  rainAt: number | null
  planter: string | null
  planterHours: number
  cropName: string
  /** mean at seed depth over the hours that the crop's minimum is held against, °C */
  seedZoneC: number
  minimumSoilC: number
  /** at or above the chance under which a field is unlikely before rain */
  likely: boolean
  savedPerPlanterHourUsd: number | null
  /** mean at stake by waiting, $; null: not known */
  atStakeUsd: number | null
  /** acres planted by the time the rain starts in the middle run, what was planted before included */
  plantedByRainAc: number
  areaAc: number
  /** nothing is dug yet, though the digger would get to it before rain */
  wouldLieOpen: boolean
  /** ranked field that saves most per planter hour */
  savesMost: boolean
  /** of the fields before the rain, the last and the first to be fit again after it */
  staysWetLongest: boolean
  driesFirst: boolean
  /** field before it in the order, when the two lie side by side */
  nextDoorTo: string | null
}

/** How the farm writes times, temperatures, areas and money. */
export interface Say {
  time: (hour: number) => string
  temperature: (celsius: number) => string
  area: (acres: number) => string
  money: (usd: number) => string
}

/** Saved per planter hour under this counts as nothing, $. */
const LEAST_PER_HOUR_USD = 1
/** At stake under this counts as nothing, $. */
const LEAST_USD = 10
/** Part of a field that must get planted before rain for it to be worth saying, 0 to 1. */
const WORTH_SAYING_SHARE = 0.25

/**
 * The reason of a ranked field.
 *
 * The first rule that applies speaks: frost; a machine that is in the field; cold; what is not known; nothing at
 * stake; then, below the cut, why it can't be done before rain; above it, when it is fit and what it saves.
 */
export function reason(facts: ReasonFacts, say: Say): string {
  if (facts.ground === 'frozen') return frozen(facts, say)
  if (facts.inField) return inField(facts.inField, say)
  if (facts.ground === 'cold') return cold(facts, say)
  if (facts.savedPerPlanterHourUsd === null) return `${fitSince(facts, say)}; no table says what waiting costs ${facts.cropName} at this date`
  if (facts.atStakeUsd !== null && facts.atStakeUsd < LEAST_USD) return nothingAtStake(facts, say)
  if (!facts.likely) return unlikely(facts, say)
  return likely(facts, facts.savedPerPlanterHourUsd, say)
}

function frozen({ fitAt, rainAt }: ReasonFacts, say: Say): string {
  if (fitAt !== null && (rainAt === null || fitAt < rainAt)) return `Frozen; fit ${say.time(fitAt)} once the frost is out`
  return 'Frozen; nothing to lose by waiting'
}

function cold({ seedZoneC, minimumSoilC, cropName }: ReasonFacts, say: Say): string {
  if (seedZoneC >= minimumSoilC) return `Warm enough, but cold rain is coming and would chill ${cropName} seed`
  const [seed, wanted] = [say.temperature(seedZoneC), say.temperature(minimumSoilC)]
  return `Dry enough, but ${seed === wanted ? 'just under ' : ''}${seed} at seed depth; wants ${wanted}`
}

function inField({ machine, areaLeftAc, doneAt }: NonNullable<ReasonFacts['inField']>, say: Say): string {
  const left = `${machine} is in it: ${say.area(areaLeftAc)} left`
  return doneAt === null ? left : `${left}, done by ${say.time(doneAt)}`
}

/** No field that can be planted before rain, or a date at which a few days cost nothing. */
function nothingAtStake(facts: ReasonFacts, say: Say): string {
  const { ground, fitAt, rainAt, cropName } = facts
  if (ground !== 'fit' && (fitAt === null || (rainAt !== null && fitAt >= rainAt))) return wetUntilRain(rainAt)
  return `${fitSince(facts, say)}; waiting costs ${cropName} almost nothing yet`
}

function wetUntilRain(rainAt: number | null): string {
  return rainAt === null ? 'Not fit within five days' : 'Too wet to work before the rain'
}

function unlikely(facts: ReasonFacts, say: Say): string {
  const { fitAt, rainAt, ground, planter, planterHours, plantedByRainAc, areaAc } = facts
  if (ground !== 'fit' && fitAt === null) return wetUntilRain(rainAt)
  const hour = ground === 'fit' ? 0 : fitAt!
  if (rainAt !== null && hour >= rainAt) return wetUntilRain(rainAt)
  if (facts.wouldLieOpen) return 'Leave it undug: it would lie open in the rain'
  if (rainAt !== null && plantedByRainAc >= WORTH_SAYING_SHARE * areaAc) return `${fitSince(facts, say)}; rain is likely to stop it at ${say.area(plantedByRainAc)}`
  if (rainAt !== null && hour + planterHours > rainAt) return `${fitSince(facts, say)}, too late to finish before rain`
  return `${fitSince(facts, say)}; only if ${planter ?? 'the planter'} is ahead of plan`
}

function likely(facts: ReasonFacts, savedUsd: number, say: Say): string {
  if (facts.ground === 'fit' && facts.savesMost && savedUsd >= LEAST_PER_HOUR_USD) return 'Fit now, and the most money per planter hour'
  if (facts.driesFirst) return `${fitSince(facts, say)}; dries fast again, so it can wait`
  if (facts.staysWetLongest) return `${fitSince(facts, say)}; stays wet longest once rained on`
  if (facts.nextDoorTo !== null) return `${fitSince(facts, say)}; next door to ${facts.nextDoorTo}`
  if (savedUsd >= LEAST_PER_HOUR_USD) return `${fitSince(facts, say)}; saves ${say.money(savedUsd)} per planter hour`
  return `${fitSince(facts, say)}; ${facts.rainAt === null ? 'no rain in sight' : 'done before the rain even if it goes last'}`
}

function fitSince({ ground, fitAt }: ReasonFacts, say: Say): string {
  if (ground === 'fit') return 'Fit now'
  return fitAt === null ? 'Not fit within five days' : `Fit by ${say.time(fitAt)}`
}
