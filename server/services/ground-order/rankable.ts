import { PASSES, type Pass } from '../../../shared/agronomy/ground'
import { CROPS } from '../../../shared/agronomy/crop/crops'
import { PLANTING_TABLES, type PlantingTable } from '../../../shared/agronomy/crop/planting-tables'
import { fieldSoil, type FieldSoil } from '../../../shared/agronomy/soil/field-soil'
import type { CropRow } from '../../db/queries/crops'
import type { SoilRow } from '../../db/queries/soils'
import type { PlaceId } from '../../../shared/types/ids'
import type { FarmInputs } from './farm-inputs'
import { needsPlanting, type FieldSeason } from './field-season'
import type { CropNeeds } from './field-ground'
import type { PlaceWork } from './place-work'

/** Minimum that no soil is under: ground without a crop is judged for tillage only. */
const NO_MINIMUM_C = -60

/** Nothing is missing then: the field just has no place in an order for planting. */
export const NOTHING_TO_PLANT = 'Nothing to plant here this season, so the rain costs it no yield'

/** A field with all that the soil model needs, and what may still keep it from being ranked. */
export interface KnownField {
  season: FieldSeason
  soilRow: SoilRow
  soil: FieldSoil
  crop: CropRow | null
  table: PlantingTable | null
  needs: CropNeeds
  place: PlaceWork
  /** why it can't be ranked, in one sentence without a full stop; null when it can */
  unranked: string | null
}
export interface UnknownField { season: FieldSeason, soilRow: SoilRow | null, crop: CropRow | null, unranked: string }

/** Looks up what a field stands on and what is sown on it, and says in words what is missing. */
export function lookUpField(
  season: FieldSeason, inputs: FarmInputs, places: ReadonlyMap<PlaceId, PlaceWork | { missing: string }>, noMachine: ReadonlyMap<Pass, string>,
): KnownField | UnknownField {
  const { field } = season
  const soilRow = inputs.soils.find(soil => soil.id === field.soilId) ?? null
  const crop = inputs.crops.find(row => row.id === field.cropId) ?? null
  const unknown = (unranked: string): UnknownField => ({ season, soilRow, crop, unranked })
  if (!soilRow) return unknown('No soil is set: add one on the Farm page so its ground can be worked out')
  if (field.placeId === null) return unknown('It has no place on the map: set one on the Farm page so its weather can be pulled')
  const place = places.get(field.placeId) ?? { missing: 'No weather has been pulled for it yet' }
  if ('missing' in place) return unknown(place.missing)
  const soil = soilOrNull(soilRow, season)
  if (!soil) return unknown('Its soil has impossible figures: check sand, clay and organic matter on the Farm page')
  return {
    season,
    soilRow,
    soil,
    crop,
    table: crop ? PLANTING_TABLES.get(crop.plantingTable) ?? null : null,
    needs: crop ? { minimumSoilC: crop.minimumSoilC, chillHours: CROPS[crop.kind].chillHours } : { minimumSoilC: NO_MINIMUM_C, chillHours: 0 },
    place,
    unranked: whyUnranked(season, crop, noMachine),
  }
}

export function isKnown(field: KnownField | UnknownField): field is KnownField {
  return 'soil' in field
}

/** A soil outside what the method takes is the farm's to correct, not a reason to answer nothing. */
function soilOrNull(soil: SoilRow, { field }: FieldSeason): FieldSoil | null {
  try {
    return fieldSoil(soil, field.drainage, field.residuePct)
  }
  catch (error) {
    if (error instanceof RangeError) return null
    throw error
  }
}

function whyUnranked(season: FieldSeason, crop: CropRow | null, noMachine: ReadonlyMap<Pass, string>): string | null {
  if (!needsPlanting(season)) return NOTHING_TO_PLANT
  if (!crop) return 'No crop is set: add one on the Farm page so that planting it can be ranked'
  const missing = PASSES.slice(0, PASSES.indexOf('plant') + 1).find((pass, index) =>
    season.needed[index] && season.doneAc[index]! < season.field.areaAc && noMachine.has(pass))
  return missing === undefined ? null : noMachine.get(missing)!
}
