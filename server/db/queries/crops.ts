import { asc, eq } from 'drizzle-orm'
import type { FarmId } from '../../../shared/types/ids'
import type { DbOrTransaction } from '../client'
import { crops } from '../schema'

export type CropRow = typeof crops.$inferSelect

export function listCrops(db: DbOrTransaction, farmId: FarmId): CropRow[] {
  return db.select().from(crops).where(eq(crops.farmId, farmId)).orderBy(asc(crops.id)).all()
}
