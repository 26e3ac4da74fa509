import { and, eq, lt } from 'drizzle-orm'
import type { FarmId, PersonId } from '../../../shared/types/ids'
import type { DbOrTransaction } from '../client'
import { auditLog, idempotencyKeys } from '../schema'

export function insertAudit(db: DbOrTransaction, entry: typeof auditLog.$inferInsert): void {
  db.insert(auditLog).values(entry).run()
}

export function findKept(db: DbOrTransaction, farmId: FarmId, personId: PersonId, key: string) {
  return db.select().from(idempotencyKeys)
    .where(and(eq(idempotencyKeys.farmId, farmId), eq(idempotencyKeys.personId, personId), eq(idempotencyKeys.key, key))).get()
}

export function insertKept(db: DbOrTransaction, kept: typeof idempotencyKeys.$inferInsert): void {
  db.insert(idempotencyKeys).values(kept).run()
}

export function deleteKeptBefore(db: DbOrTransaction, before: Date): void {
  db.delete(idempotencyKeys).where(lt(idempotencyKeys.createdAt, before)).run()
}
