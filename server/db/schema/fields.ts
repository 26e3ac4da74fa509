import { sql } from 'drizzle-orm'
import { check, foreignKey, integer, real, sqliteTable, text, unique } from 'drizzle-orm/sqlite-core'
import type { CropId, FarmId, FieldId, PlaceId, SoilId } from '../../../shared/types/ids'
import { farms, places } from './farms'

/** A soil as the survey describes it. Percent by weight of the fine earth. */
export const soils = sqliteTable('soils', {
  id: text().$type<SoilId>().notNull().primaryKey(),
  farmId: text().$type<FarmId>().notNull().references(() => farms.id),
  name: text().notNull(),
  sandPct: real().notNull(),
  clayPct: real().notNull(),
  organicMatterPct: real().notNull(),
}, t => [unique('soils_in_farm').on(t.farmId, t.id)])

export const crops = sqliteTable('crops', {
  id: text().$type<CropId>().notNull().primaryKey(),
  farmId: text().$type<FarmId>().notNull().references(() => farms.id),
  name: text().notNull(),
  kind: text({ enum: ['corn', 'soybean', 'wheat', 'oats'] }).notNull(),
  goalYieldBuPerAc: real().notNull(),
  priceUsdPerBu: real().notNull(),
  /** mean soil temperature at seed depth below which it is too cold to plant, °C */
  minimumSoilC: real().notNull(),
  /** key of a published yield-by-planting-date table in shared/agronomy/crop */
  plantingTable: text().notNull(),
}, t => [unique('crops_in_farm').on(t.farmId, t.id)])

export const fields = sqliteTable('fields', {
  id: text().$type<FieldId>().notNull().primaryKey(),
  farmId: text().$type<FarmId>().notNull().references(() => farms.id),
  name: text().notNull(),
  areaAc: real().notNull(),
  latitude: real().notNull(),
  longitude: real().notNull(),
  placeId: text().$type<PlaceId>().references(() => places.id),
  soilId: text().$type<SoilId>(),
  cropId: text().$type<CropId>(),
  drainage: text({ enum: ['tiled', 'somewhat-poor', 'poor'] }).notNull(),
  residuePct: real().notNull().default(30),
  /** which of the five passes the field gets this season */
  chain: text({ mode: 'json' }).$type<('dig' | 'rocks' | 'plant' | 'roll' | 'spray')[]>().notNull(),
  createdAt: integer({ mode: 'timestamp_ms' }).notNull(),
}, t => [
  unique('fields_in_farm').on(t.farmId, t.id),
  unique('fields_by_name').on(t.farmId, t.name),
  foreignKey({ columns: [t.farmId, t.soilId], foreignColumns: [soils.farmId, soils.id] }),
  foreignKey({ columns: [t.farmId, t.cropId], foreignColumns: [crops.farmId, crops.id] }),
  check('fields_area', sql`${t.areaAc} > 0`),
])
