import { minimumSoilC } from './germination'

export const CROP_KINDS = ['corn', 'soybean', 'wheat', 'oats'] as const
export type CropKind = (typeof CROP_KINDS)[number]

/** What Sillion assumes of a crop until the farm says otherwise. */
export interface CropDefaults {
  /** mean soil temperature at seed depth below which it is too cold to plant, °C */
  minimumSoilC: number
  /** key into PLANTING_TABLES */
  plantingTable: string
  /** hours after planting in which cold rain harms the swallowing seed; 0: no published rule for this crop */
  chillHours: number
}

/**
 * Defaults by crop. Chilling window: corn 48 h, soybean 24 h (Nebraska Extension 2020; Penn State 2022); none was
 * found for small grains. The small-grain zone is the one between I-94 and US 2.
 */
export const CROPS: Record<CropKind, CropDefaults> = {
  corn: { minimumSoilC: minimumSoilC('corn'), plantingTable: 'corn-minnesota-1', chillHours: 48 },
  soybean: { minimumSoilC: minimumSoilC('soybean'), plantingTable: 'soybean-minnesota', chillHours: 24 },
  wheat: { minimumSoilC: minimumSoilC('spring wheat'), plantingTable: 'wheat-us-2', chillHours: 0 },
  oats: { minimumSoilC: minimumSoilC('oats'), plantingTable: 'oats-us-2', chillHours: 0 },
}
