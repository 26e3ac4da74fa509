import { eq } from 'drizzle-orm'
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

export function releaseJob(db: DbOrTransaction, name: string, result: { lastSuccessAt?: Date, lastFailure: string | null, retryAt: Date | null }): void {
  db.update(jobs).set({ lockedBy: null, lockedUntil: null, ...result }).where(eq(jobs.name, name)).run()
}
