import { and, asc, eq } from 'drizzle-orm'
import type { FarmId, FieldId, MachineId } from '../../../shared/types/ids'
import type { DbOrTransaction } from '../client'
import { machines } from '../schema'

export type MachineRow = typeof machines.$inferSelect

export function listMachines(db: DbOrTransaction, farmId: FarmId): MachineRow[] {
  return db.select().from(machines).where(eq(machines.farmId, farmId)).orderBy(asc(machines.pass), asc(machines.id)).all()
}

export function findMachine(db: DbOrTransaction, farmId: FarmId, id: MachineId): MachineRow | undefined {
  return db.select().from(machines).where(and(eq(machines.farmId, farmId), eq(machines.id, id))).get()
}

/** Notes the field that a machine stands in. */
export function updateMachinePlace(db: DbOrTransaction, farmId: FarmId, id: MachineId, atFieldId: FieldId): void {
  db.update(machines).set({ atFieldId }).where(and(eq(machines.farmId, farmId), eq(machines.id, id))).run()
}
