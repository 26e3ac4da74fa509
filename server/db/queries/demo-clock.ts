import type { DbOrTransaction } from '../client'
import { demoClock } from '../schema'

/** The latest demo time that was reached, so that the demo goes on where it was left. */
export function findDemoClock(db: DbOrTransaction): Date | undefined {
  return db.select().from(demoClock).get()?.reachedAt
}

export function keepDemoClock(db: DbOrTransaction, reachedAt: Date): void {
  db.insert(demoClock).values({ id: 1, reachedAt }).onConflictDoUpdate({ target: demoClock.id, set: { reachedAt } }).run()
}
