import { foreignKey, index, integer, real, sqliteTable, text, unique } from 'drizzle-orm/sqlite-core'
import type { FarmId, FieldId, MachineId, PassRecordId, PersonId } from '../../../shared/types/ids'
import { farms } from './farms'
import { fields } from './fields'

export const machines = sqliteTable('machines', {
  id: text().$type<MachineId>().notNull().primaryKey(),
  farmId: text().$type<FarmId>().notNull().references(() => farms.id),
  name: text().notNull(),
  pass: text({ enum: ['dig', 'rocks', 'plant', 'roll', 'spray'] }).notNull(),
  driver: text(),
  widthFt: real(),
  speedMph: real(),
  fieldEfficiency: real(),
  /** working hours of the day at the farm, 0 to 24 */
  fromHour: real().notNull(),
  toHour: real().notNull(),
  foldMinutes: real().notNull().default(10),
  roadMph: real().notNull().default(15),
  atFieldId: text().$type<FieldId>(),
  downUntil: integer({ mode: 'timestamp_ms' }),
  downReason: text(),
}, t => [
  unique('machines_in_farm').on(t.farmId, t.id),
  foreignKey({ columns: [t.farmId, t.atFieldId], foreignColumns: [fields.farmId, fields.id] }),
])

/** Acres worked in one go. A pass of a field is done when its records add up to the field. */
export const passRecords = sqliteTable('pass_records', {
  id: text().$type<PassRecordId>().notNull().primaryKey(),
  farmId: text().$type<FarmId>().notNull().references(() => farms.id),
  fieldId: text().$type<FieldId>().notNull(),
  machineId: text().$type<MachineId>(),
  pass: text({ enum: ['dig', 'rocks', 'plant', 'roll', 'spray'] }).notNull(),
  areaAc: real().notNull(),
  startedAt: integer({ mode: 'timestamp_ms' }).notNull(),
  endedAt: integer({ mode: 'timestamp_ms' }).notNull(),
  note: text(),
  /** null when the demo's invented crew did it */
  enteredBy: text().$type<PersonId>(),
  enteredAt: integer({ mode: 'timestamp_ms' }).notNull(),
}, t => [
  index('pass_records_by_field').on(t.farmId, t.fieldId),
  foreignKey({ columns: [t.farmId, t.fieldId], foreignColumns: [fields.farmId, fields.id] }),
  foreignKey({ columns: [t.farmId, t.machineId], foreignColumns: [machines.farmId, machines.id] }),
])
