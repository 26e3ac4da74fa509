import { desc, eq } from 'drizzle-orm'
import type { DbOrTransaction } from '../client'
import { weatherPulls } from '../schema'

export type PullRow = typeof weatherPulls.$inferSelect

export function insertPull(db: DbOrTransaction, startedAt: Date, places: number): number {
  return db.insert(weatherPulls).values({ startedAt, places, outcome: 'running' }).returning({ id: weatherPulls.id }).get().id
}

export function updatePull(db: DbOrTransaction, id: number, result: { endedAt: Date, outcome: 'done' | 'failed', stored: number, detail: string | null }): void {
  db.update(weatherPulls).set(result).where(eq(weatherPulls.id, id)).run()
}

/** A pull that was running when the process ended came to nothing: its transaction was undone. */
export function abandonPulls(db: DbOrTransaction, endedAt: Date): void {
  db.update(weatherPulls).set({ outcome: 'abandoned', endedAt }).where(eq(weatherPulls.outcome, 'running')).run()
}

export function findNewestPull(db: DbOrTransaction): PullRow | undefined {
  return db.select().from(weatherPulls).orderBy(desc(weatherPulls.id)).limit(1).get()
}
