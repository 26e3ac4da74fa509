import { asc, eq } from 'drizzle-orm'
import type { FarmId } from '../../../shared/types/ids'
import type { DbOrTransaction } from '../client'
import { soils } from '../schema'

export type SoilRow = typeof soils.$inferSelect

export function listSoils(db: DbOrTransaction, farmId: FarmId): SoilRow[] {
  return db.select().from(soils).where(eq(soils.farmId, farmId)).orderBy(asc(soils.id)).all()
}
