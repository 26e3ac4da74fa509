import { randomUUID } from 'node:crypto'
import type { z } from 'zod'
import type { NewPassRecord } from '../../shared/schemas/passes'
import type { FarmId, FieldId, MachineId, PassRecordId, PersonId } from '../../shared/types/ids'
import type { DbOrTransaction } from '../db/client'
import type { Farm } from '../db/queries/farms'
import { findField } from '../db/queries/fields'
import { findMachine, updateMachinePlace } from '../db/queries/machines'
import { findLastWorkEnd, insertPassRecord, sumPassAcres, type PassRecordRow } from '../db/queries/pass-records'
import { seasonOf } from './season'

export type Logged
  = | { outcome: 'logged', record: PassRecordRow, doneBeforeAc: number }
    | { outcome: 'no-field' | 'no-machine' | 'wrong-machine' | 'not-in-chain' | 'in-the-future' | 'too-long-ago' }
    | { outcome: 'too-many-acres', leftAc: number }

/** Acres by which a field may be overshot before somebody is asked to check: meters and maps differ. */
const OVERSHOOT_SHARE = 0.05
/** What lies longer back is a slip of the year: late entries are of this season or the one before. */
const OLDEST_MS = 2 * 366 * 24 * 3_600_000

/** Keeps acres that were worked in a field. Nothing is kept unless the outcome is `logged`. */
export function logPass(tx: DbOrTransaction, { id: farmId, zone }: Pick<Farm, 'id' | 'zone'>, fieldId: string, personId: PersonId, now: Date, entry: z.output<typeof NewPassRecord>): Logged {
  const field = findField(tx, farmId, fieldId as FieldId)
  if (!field) return { outcome: 'no-field' }
  if (!field.chain.includes(entry.pass)) return { outcome: 'not-in-chain' }
  const machine = entry.machineId === null ? null : findMachine(tx, farmId, entry.machineId as MachineId)
  if (machine === undefined) return { outcome: 'no-machine' }
  if (machine && machine.pass !== entry.pass) return { outcome: 'wrong-machine' }
  const endedAt = new Date(entry.endedAt)
  if (endedAt.getTime() > now.getTime() + 60_000) return { outcome: 'in-the-future' }
  if (endedAt.getTime() < now.getTime() - OLDEST_MS) return { outcome: 'too-long-ago' }
  const doneBeforeAc = sumPassAcres(tx, farmId, field.id, entry.pass, seasonOf(endedAt, zone))
  const leftAc = field.areaAc - doneBeforeAc
  if (entry.areaAc > leftAc + OVERSHOOT_SHARE * field.areaAc) return { outcome: 'too-many-acres', leftAc }
  if (machine) moveMachine(tx, farmId, machine.id, field.id, endedAt)
  const record = insertPassRecord(tx, {
    id: randomUUID() as string as PassRecordId, farmId, fieldId: field.id, machineId: machine?.id ?? null, pass: entry.pass, areaAc: entry.areaAc,
    startedAt: new Date(entry.startedAt), endedAt, note: entry.note, enteredBy: personId, enteredAt: now,
  })
  return { outcome: 'logged', record, doneBeforeAc }
}

/** A machine stands where it worked last; a phone that was offline may tell of earlier work later. */
function moveMachine(tx: DbOrTransaction, farmId: FarmId, machineId: MachineId, fieldId: FieldId, endedAt: Date): void {
  const lastEnd = findLastWorkEnd(tx, farmId, machineId)
  if (!lastEnd || lastEnd <= endedAt) updateMachinePlace(tx, farmId, machineId, fieldId)
}
