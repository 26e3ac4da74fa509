import { createHash, randomBytes } from 'node:crypto'
import type { PersonId } from '../../shared/types/ids'
import type { Db } from '../db/client'
import { findActivePerson, findPersonByEmail, updatePasswordHash, type Person } from '../db/queries/people'
import { insertAudit } from '../db/queries/records'
import {
  countTries, deleteExpiredSessions, deleteOldTries, deleteTries, findOpenSession, insertSession, insertTry, knowsAddress, updateSessionEnded, updateSessionSeen,
} from '../db/queries/sessions'
import { closeStreamsOf } from './open-streams'
import { hashPassword, isHashingBusy, isPassword, isWeakHash, NOBODYS_HASH } from './passwords'

const MINUTE = 60_000
const DAY = 24 * 60 * MINUTE
/** Signing in in a cab is costly, so sessions are long; they end at the server on sign-out. */
const IDLE_MS = 14 * DAY
const ABSOLUTE_MS = 90 * DAY
const SEEN_EVERY_MS = MINUTE
/**
 * Failed tries allowed: on one account from one address; from one address on any account; on one account from
 * addresses that the person never signed in from. The last leaves the person's own addresses alone, so that nobody
 * is locked out by a stranger.
 */
const LIMITS = { pair: { tries: 10, within: 15 * MINUTE }, address: { tries: 50, within: 60 * MINUTE }, account: { tries: 100, within: 60 * MINUTE } }

const sha256 = (text: string) => createHash('sha256').update(text).digest('base64url')

export type SignIn
  = | { outcome: 'signed-in', person: Person, sessionId: string }
    | { outcome: 'refused' | 'busy' }
    | { outcome: 'too-many-tries', retryAfterSeconds: number }

/**
 * Checks e-mail and password, within the limits on tries, and opens a session.
 *
 * A known and an unknown e-mail take the same time and get the same answer.
 *
 * @param address - where the request came from
 */
export async function signIn(db: Db, now: Date, attempt: { email: string, password: string, address: string }): Promise<SignIn> {
  const email = attempt.email.trim().toLowerCase()
  const accountHash = sha256(email)
  const person = findPersonByEmail(db, email)
  const wait = secondsToWait(db, now, accountHash, attempt.address, person?.id)
  if (wait > 0) return { outcome: 'too-many-tries', retryAfterSeconds: wait }
  if (isHashingBusy()) return { outcome: 'busy' }
  // Counted before it is known to fail, so that many at once can't slip past the count.
  insertTry(db, { accountHash, address: attempt.address, at: now })
  deleteOldTries(db, new Date(now.getTime() - DAY))
  const right = await isPassword(attempt.password, person?.passwordHash ?? NOBODYS_HASH)
  if (!right || !person || person.disabledAt) return { outcome: 'refused' }
  const better = isWeakHash(person.passwordHash) ? await hashPassword(attempt.password) : null
  const sessionId = randomBytes(32).toString('base64url')
  db.transaction((tx) => {
    deleteTries(tx, accountHash, attempt.address)
    if (better) {
      updatePasswordHash(tx, person.id, better)
      insertAudit(tx, { personId: person.id, at: now, action: 'hashed-anew', subject: 'password', subjectId: person.id })
    }
    deleteExpiredSessions(tx, now)
    insertSession(tx, {
      idHash: sha256(sessionId), personId: person.id, address: attempt.address, createdAt: now, lastSeenAt: now, expiresAt: new Date(now.getTime() + ABSOLUTE_MS),
    })
  }, { behavior: 'immediate' })
  return { outcome: 'signed-in', person, sessionId }
}

function secondsToWait(db: Db, now: Date, accountHash: string, address: string, personId: PersonId | undefined): number {
  const known = personId !== undefined && knowsAddress(db, personId, address)
  const checks = [
    { ...LIMITS.pair, by: { accountHash, address } },
    { ...LIMITS.address, by: { address } },
    ...(known ? [] : [{ ...LIMITS.account, by: { accountHash } }]),
  ]
  const waits = checks.map(({ tries, within, by }) => {
    const { n, oldest } = countTries(db, by, new Date(now.getTime() - within))
    return n < tries || !oldest ? 0 : Math.ceil((oldest.getTime() + within - now.getTime()) / 1000)
  })
  return Math.max(...waits)
}

/** The person behind a session that is open and not idle for too long; undefined otherwise. */
export function personOfSession(db: Db, now: Date, sessionId: string): Person | undefined {
  const idHash = sha256(sessionId)
  const session = findOpenSession(db, idHash, now)
  if (!session || now.getTime() - session.lastSeenAt.getTime() > IDLE_MS) return undefined
  if (now.getTime() - session.lastSeenAt.getTime() > SEEN_EVERY_MS) updateSessionSeen(db, idHash, now)
  return findActivePerson(db, session.personId)
}

export function signOut(db: Db, now: Date, sessionId: string): void {
  updateSessionEnded(db, sha256(sessionId), now)
  closeStreamsOf(sessionId)
}
