import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import type { App } from '../../../server/services/app'
import { createDemoClock } from '../../../server/services/clock'
import { registerJob, runDueJobs, runJobsUntil, stopJobs } from '../../../server/services/jobs'
import { readSettings } from '../../../server/services/settings'
import { NOW, temporaryDatabase, type TemporaryDatabase } from '../temporary-database'

describe('stopJobs', () => {
  let temporary: TemporaryDatabase
  beforeEach(() => temporary = temporaryDatabase())
  afterEach(() => temporary.close())

  it('waits for the job that runs, starts no other, and leaves the clock where it is', async () => {
    const demoClock = createDemoClock(NOW, { now: () => new Date(0) })
    const app: App = { db: temporary.db, sqlite: temporary.sqlite, clock: demoClock, demoClock, settings: readSettings({ NUXT_SESSION_PASSWORD: 'x'.repeat(40) }, { fakesLoaded: false, built: false }) }
    const said: string[] = []
    let finish = () => {}
    const held = new Promise<void>(resolve => finish = resolve)
    const dueAt = (_: App, last: Date | null) => new Date((last ?? NOW).getTime() + 60_000)
    registerJob({ name: 'long', dueAt, run: async () => {
      said.push('begun')
      await held
      said.push('ended')
    } })
    const move = runJobsUntil(app, new Date(NOW.getTime() + 3_600_000))
    await Promise.resolve().then(() => undefined)
    const stopped = stopJobs().then(() => said.push('stopped'))
    finish()
    await Promise.all([move, stopped])
    expect(said).toEqual(['begun', 'ended', 'stopped'])
    expect(app.clock.now()).toEqual(new Date(NOW.getTime() + 60_000))
    demoClock.moveTo(new Date(NOW.getTime() + 7_200_000))
    await runDueJobs(app)
    expect(said).toHaveLength(3)
  })
})
