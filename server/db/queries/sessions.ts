import { and, count, eq, gt, isNull, lt, min } from 'drizzle-orm'
import type { PersonId } from '../../../shared/types/ids'
import type { DbOrTransaction } from '../client'
import { sessions, signInTries } from '../schema'

export function insertSession(db: DbOrTransaction, session: typeof sessions.$inferInsert): void {
  db.insert(sessions).values(session).run()
}

export function findOpenSession(db: DbOrTransaction, idHash: string, now: Date) {
  return db.select().from(sessions)
    .where(and(eq(sessions.idHash, idHash), isNull(sessions.endedAt), gt(sessions.expiresAt, now))).get()
}

export function updateSessionSeen(db: DbOrTransaction, idHash: string, lastSeenAt: Date): void {
  db.update(sessions).set({ lastSeenAt }).where(eq(sessions.idHash, idHash)).run()
}

export function updateSessionEnded(db: DbOrTransaction, idHash: string, endedAt: Date): void {
  db.update(sessions).set({ endedAt }).where(and(eq(sessions.idHash, idHash), isNull(sessions.endedAt))).run()
}

/** Sessions that nobody could open any more. */
export function deleteExpiredSessions(db: DbOrTransaction, now: Date): void {
  db.delete(sessions).where(lt(sessions.expiresAt, now)).run()
}

/** True when the person has signed in from this address before. */
export function knowsAddress(db: DbOrTransaction, personId: PersonId, address: string): boolean {
  return db.select({ n: count() }).from(sessions).where(and(eq(sessions.personId, personId), eq(sessions.address, address))).get()!.n > 0
}

export function insertTry(db: DbOrTransaction, attempt: { accountHash: string, address: string, at: Date }): void {
  db.insert(signInTries).values(attempt).run()
}

/** How many failed tries there were since, by account, by address or by both, and when the oldest was. */
export function countTries(db: DbOrTransaction, by: { accountHash?: string, address?: string }, since: Date): { n: number, oldest: Date | null } {
  return db.select({ n: count(), oldest: min(signInTries.at) }).from(signInTries).where(and(
    gt(signInTries.at, since),
    by.accountHash === undefined ? undefined : eq(signInTries.accountHash, by.accountHash),
    by.address === undefined ? undefined : eq(signInTries.address, by.address),
  )).get()!
}

export function deleteTries(db: DbOrTransaction, accountHash: string, address: string): void {
  db.delete(signInTries).where(and(eq(signInTries.accountHash, accountHash), eq(signInTries.address, address))).run()
}

export function deleteOldTries(db: DbOrTransaction, before: Date): void {
  db.delete(signInTries).where(lt(signInTries.at, before)).run()
}
