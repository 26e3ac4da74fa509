import { createHash } from 'node:crypto'
import type { FarmId, PersonId } from '../../shared/types/ids'
import type { Db, DbOrTransaction } from '../db/client'
import { updateRevision } from '../db/queries/farms'
import { deleteKeptBefore, findKept, insertAudit, insertKept } from '../db/queries/records'
import { announceChange } from './changes'

/** How long a repeat is answered as the first time: phones stay offline for days. */
const KEPT_MS = 14 * 24 * 3_600_000

export interface WriteRequest {
  db: Db
  farmId: FarmId
  personId: PersonId
  now: Date
  /** Idempotency-Key: a UUID made when the form was opened */
  key: string
  method: string
  path: string
  body: unknown
}

/** What a change did: the answer to the client, and what the audit log keeps. */
export interface Effect<Answer> {
  status: number
  answer: Answer
  audit: { action: string, subject: string, subjectId: string, before: unknown, after: unknown }
}

export type Written
  = | { outcome: 'written' | 'repeated', status: number, body: string }
    | { outcome: 'key-reused' }

/**
 * Carries out a change once, whatever a flaky phone repeats: the effect, its audit row, the farm's revision and the
 * kept answer are one transaction.
 *
 * @param effect - synchronous; what it throws undoes everything
 * @returns the answer as JSON text, the same for a repeat; `key-reused` when the key came with other data before
 */
export function writeOnce<Answer>(request: WriteRequest, effect: (tx: DbOrTransaction) => Effect<Answer>): Written {
  const { db, farmId, personId, now, key, method, path } = request
  const bodyHash = createHash('sha256').update(JSON.stringify([method, path, request.body])).digest('base64url')
  const written = db.transaction((tx): Written => {
    const kept = findKept(tx, farmId, personId, key)
    if (kept) return kept.bodyHash === bodyHash ? { outcome: 'repeated', status: kept.status, body: kept.body } : { outcome: 'key-reused' }
    const { status, answer, audit } = effect(tx)
    const body = JSON.stringify(answer)
    insertAudit(tx, { farmId, personId, at: now, ...audit })
    insertKept(tx, { farmId, personId, key, method, path, bodyHash, status, body, createdAt: now })
    deleteKeptBefore(tx, new Date(now.getTime() - KEPT_MS))
    updateRevision(tx, farmId)
    return { outcome: 'written', status, body }
  }, { behavior: 'immediate' })
  if (written.outcome === 'written') announceChange(farmId)
  return written
}
