import { and, eq, max } from 'drizzle-orm'
import type { Db, DbOrTransaction } from '../client'
import { jobs } from '../schema'

export function findJob(db: DbOrTransaction, name: string) {
  return db.select().from(jobs).where(eq(jobs.name, name)).get()
}

/** @returns false while another worker holds the job and its lease has not run out */
export function claimJob(db: Db, name: string, worker: string, now: Date, lockedUntil: Date): boolean {
  return db.transaction((tx) => {
    const held = findJob(tx, name)
    if (held?.lockedBy && held.lockedBy !== worker && held.lockedUntil && held.lockedUntil > now) return false
    tx.insert(jobs).values({ name, lockedBy: worker, lockedUntil })
      .onConflictDoUpdate({ target: jobs.name, set: { lockedBy: worker, lockedUntil } }).run()
    return true
  }, { behavior: 'immediate' })
}

/** Moves the end of the lease of whoever holds the job; does nothing for anybody else. */
export function renewJob(db: DbOrTransaction, name: string, worker: string, lockedUntil: Date): void {
  db.update(jobs).set({ lockedUntil }).where(and(eq(jobs.name, name), eq(jobs.lockedBy, worker))).run()
}

/** Lets go of a job and notes what came of it; does nothing when another worker has taken it over. */
export function releaseJob(db: DbOrTransaction, name: string, worker: string, result: { lastSuccessAt?: Date, lastFailure: string | null, retryAt: Date | null }): void {
  db.update(jobs).set({ lockedBy: null, lockedUntil: null, ...result }).where(and(eq(jobs.name, name), eq(jobs.lockedBy, worker))).run()
}

/** When any job last went well. */
export function findLastSuccess(db: DbOrTransaction): Date | null {
  return db.select({ at: max(jobs.lastSuccessAt) }).from(jobs).get()?.at ?? null
}
