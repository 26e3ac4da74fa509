import { and, asc, eq } from 'drizzle-orm'
import type { FarmId, FieldId } from '../../../shared/types/ids'
import type { DbOrTransaction } from '../client'
import { fields } from '../schema'

export type FieldRow = typeof fields.$inferSelect

export function listFields(db: DbOrTransaction, farmId: FarmId): FieldRow[] {
  return db.select().from(fields).where(eq(fields.farmId, farmId)).orderBy(asc(fields.id)).all()
}

export function findField(db: DbOrTransaction, farmId: FarmId, id: FieldId): FieldRow | undefined {
  return db.select().from(fields).where(and(eq(fields.farmId, farmId), eq(fields.id, id))).get()
}
