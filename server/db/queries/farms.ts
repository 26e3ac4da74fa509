import { eq, sql } from 'drizzle-orm'
import type { FarmId } from '../../../shared/types/ids'
import type { DbOrTransaction } from '../client'
import { farms } from '../schema'

export type Farm = typeof farms.$inferSelect

export function listFarms(db: DbOrTransaction): Farm[] {
  return db.select().from(farms).orderBy(farms.id).all()
}

export function findFarm(db: DbOrTransaction, farmId: FarmId): Farm | undefined {
  return db.select().from(farms).where(eq(farms.id, farmId)).get()
}

/** Tells caches and open pages that the farm's own data has changed. */
export function updateRevision(db: DbOrTransaction, farmId: FarmId): void {
  db.update(farms).set({ revision: sql`${farms.revision} + 1` }).where(eq(farms.id, farmId)).run()
}
