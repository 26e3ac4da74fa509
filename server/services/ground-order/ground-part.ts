import type { Pass } from '../../../shared/agronomy/ground'
import type { GroundRow } from '../../../shared/types/ground-order'
import type { Ground } from './field-ground'
import { passProgress } from './field-season'
import { groundWords, stretchesOf } from './ground-track'
import { explainGround } from './explain'
import type { KnownField, UnknownField } from './rankable'
import { rounded } from './ribbon'

type Unranked = Pick<GroundRow, 'rank' | 'beforeRain' | 'doneBeforeRain' | 'atStake' | 'savedPerPlanterHourUsd' | 'planterHours' | 'bars'>
/** What a field that can't be ranked has instead of numbers. */
const UNRANKED: Unranked = { rank: null, beforeRain: false, doneBeforeRain: null, atStake: null, savedPerPlanterHourUsd: null, planterHours: null, bars: [] }

/** Pass that the field's ground is judged for: the next one, or planting. */
export function nextPass({ season }: KnownField): Pass {
  return season.next ?? 'plant'
}

/** What the soil model alone says about a field. */
export function groundPart(known: KnownField, ground: Ground, { middle, at }: { middle: number, at: (hour: number) => string }) {
  const { season, soil } = { season: known.season, soil: ground.soil }
  const words = groundWords(ground.middle.marks, nextPass(known))
  const fitAt = words.indexOf('fit')
  const again = ground.fitAgainAt[middle]!
  const chamber = (water: number, fit: number) => ({ water, fit, empty: soil.properties.wiltingPoint, full: soil.properties.saturation })
  return {
    ...named(known),
    ground: words[0]!,
    core: { seedZone: chamber(ground.now.seedZoneWater, soil.fitWater), below: chamber(ground.now.belowWater, soil.belowFitWater) },
    chain: passProgress(season),
    fitAt: fitAt > 0 ? at(fitAt) : null,
    fitAgainAt: Number.isFinite(again) ? at(again) : null,
    track: stretchesOf(words, at),
    aboveFitMm: Array.from(ground.middle.aboveFitMm, mm => rounded(mm, 2)),
  }
}

/** A field whose ground is known and which still can't be ranked. */
export function unrankedRow(known: KnownField, ground: Ground, context: { middle: number, at: (hour: number) => string }): GroundRow {
  const explanation = explainGround(known, ground)
  const nothing = { rows: [], sources: [], unsure: known.unranked }
  return {
    ...UNRANKED,
    ...groundPart(known, ground, context),
    reason: known.unranked!,
    explain: { ground: explanation, doneBeforeRain: nothing, atStake: nothing, savedPerPlanterHour: nothing },
  }
}

/** A field about whose ground nothing is known. */
export function unknownRow(field: UnknownField): GroundRow {
  return {
    ...UNRANKED,
    ...named(field),
    ground: null,
    core: null,
    chain: passProgress(field.season),
    reason: field.unranked,
    fitAt: null,
    fitAgainAt: null,
    track: [],
    aboveFitMm: [],
    explain: null,
  }
}

function named({ season, crop, soilRow }: KnownField | UnknownField) {
  const { id, name, areaAc } = season.field
  return { id, name, areaAc, crop: crop?.name ?? null, soil: soilRow?.name ?? null }
}
