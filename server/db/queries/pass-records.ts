import { and, eq, gte, lt, max, sum } from 'drizzle-orm'
import type { Pass } from '../../../shared/agronomy/ground'
import type { FarmId, FieldId, MachineId } from '../../../shared/types/ids'
import type { DbOrTransaction } from '../client'
import { passRecords } from '../schema'

export type PassRecordRow = typeof passRecords.$inferSelect
/** Acres done of a pass in a field, and when the last of them were. */
export interface PassTotal { fieldId: FieldId, pass: Pass, areaAc: number, lastEndedAt: Date }

/** What the records of a season add up to, a row for each field and pass that has any. */
export function listPassTotals(db: DbOrTransaction, farmId: FarmId, { from, to }: { from: Date, to: Date }): PassTotal[] {
  return db.select({
    fieldId: passRecords.fieldId,
    pass: passRecords.pass,
    areaAc: sum(passRecords.areaAc).mapWith(Number),
    lastEndedAt: max(passRecords.endedAt),
  }).from(passRecords)
    .where(and(eq(passRecords.farmId, farmId), gte(passRecords.endedAt, from), lt(passRecords.endedAt, to)))
    .groupBy(passRecords.fieldId, passRecords.pass)
    .all()
    .map(({ lastEndedAt, ...row }) => ({ ...row, lastEndedAt: lastEndedAt! }))
}

/** Acres that the records of a season give a pass of one field. */
export function sumPassAcres(db: DbOrTransaction, farmId: FarmId, fieldId: FieldId, pass: Pass, { from, to }: { from: Date, to: Date }): number {
  const total = db.select({ areaAc: sum(passRecords.areaAc).mapWith(Number) }).from(passRecords)
    .where(and(eq(passRecords.farmId, farmId), eq(passRecords.fieldId, fieldId), eq(passRecords.pass, pass), gte(passRecords.endedAt, from), lt(passRecords.endedAt, to)))
    .get()
  return total?.areaAc ?? 0
}

/** When the machine's latest work ended; null: it has no record. */
export function findLastWorkEnd(db: DbOrTransaction, farmId: FarmId, machineId: MachineId): Date | null {
  const last = db.select({ endedAt: max(passRecords.endedAt) }).from(passRecords)
    .where(and(eq(passRecords.farmId, farmId), eq(passRecords.machineId, machineId)))
    .get()
  return last?.endedAt ?? null
}

export function insertPassRecord(db: DbOrTransaction, record: typeof passRecords.$inferInsert): PassRecordRow {
  return db.insert(passRecords).values(record).returning().get()
}
