import { getHeader, setResponseHeader, setResponseStatus, type H3Event } from 'h3'
import type { DbOrTransaction } from '../db/client'
import { writeOnce, type Effect } from '../services/write'
import { fail } from './fail'
import type { FarmContext } from './require-farm'

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/

/** Carries out a change under the request's Idempotency-Key and answers it. */
export function answerWrite<Answer>(event: H3Event, context: FarmContext, body: unknown, effect: (tx: DbOrTransaction) => Effect<Answer>): Answer {
  const key = (getHeader(event, 'idempotency-key') ?? '').toLowerCase()
  if (!UUID.test(key)) fail(400, 'no-key', 'Send an Idempotency-Key header with a UUID, the same one with every repeat of this change.')
  const { db, farm, person, now } = context
  const written = writeOnce({ db, farmId: farm.id, personId: person.id, now, key, method: event.method, path: event.path.replace(/\?.*$/, '').replace(/\/$/, ''), body }, effect)
  if (written.outcome === 'key-reused') fail(422, 'key-reused', 'This Idempotency-Key came with other data before. Make a new one for a new change.')
  if (written.outcome === 'repeated') setResponseHeader(event, 'idempotent-replayed', 'true')
  setResponseStatus(event, written.status)
  return JSON.parse(written.body) as Answer
}
