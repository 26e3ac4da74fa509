import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { findDemoClock } from '../../../server/db/queries/demo-clock'
import { claimJob, findJob, releaseJob, renewJob } from '../../../server/db/queries/jobs'
import type { App } from '../../../server/services/app'
import { createDemoClock } from '../../../server/services/clock'
import { registerJob, runDueJobs, runJobsUntil } from '../../../server/services/jobs'
import { readSettings } from '../../../server/services/settings'
import { NOW, temporaryDatabase, type TemporaryDatabase } from '../temporary-database'

const HOUR = 3_600_000
const ran: [string, string][] = []
let fails = false
const hourly = (name: string, minute: number) => ({
  name,
  dueAt: (_: App, last: Date | null) => last ? new Date(Math.floor((last.getTime() - minute * 60_000) / HOUR + 1) * HOUR + minute * 60_000) : new Date(0),
  async run(app: App, at: Date) {
    expect(Math.abs(app.clock.now().getTime() - at.getTime())).toBeLessThan(1000)
    if (fails) throw new Error('The service is away.')
    ran.push([name, at.toISOString().slice(11, 16)])
  },
})
registerJob(hourly('one', 41))
registerJob(hourly('two', 10))

describe('jobs', () => {
  let temporary: TemporaryDatabase
  let app: App
  beforeEach(() => {
    temporary = temporaryDatabase()
    const machine = { now: () => new Date(0) }
    const demoClock = createDemoClock(NOW, machine)
    app = { db: temporary.db, sqlite: temporary.sqlite, clock: demoClock, demoClock, settings: readSettings({ NUXT_SESSION_PASSWORD: 'x'.repeat(40) }, { fakesLoaded: false, built: false }) }
    ran.length = 0
    fails = false
  })
  afterEach(() => temporary.close())

  it('run once when due, however late, and not again until due again', async () => {
    await runDueJobs(app)
    await runDueJobs(app)
    expect(ran).toEqual([['one', '10:00'], ['two', '10:00']])
    app.demoClock!.moveTo(new Date(NOW.getTime() + 26 * HOUR))
    await runDueJobs(app)
    expect(ran).toHaveLength(4)
  })

  it('run in the order in which they fall due as the demo’s clock moves on', async () => {
    await runDueJobs(app)
    ran.length = 0
    await runJobsUntil(app, new Date(NOW.getTime() + 2 * HOUR))
    expect(ran).toEqual([['two', '10:10'], ['one', '10:41'], ['two', '11:10'], ['one', '11:41']])
    expect(app.clock.now()).toEqual(new Date(NOW.getTime() + 2 * HOUR))
  })

  it('are tried again a little later after a failure, which is kept', async () => {
    fails = true
    await runDueJobs(app)
    expect(findJob(app.db, 'one')).toMatchObject({ lastFailure: 'The service is away.', lockedBy: null, lastSuccessAt: null })
    fails = false
    await runDueJobs(app)
    expect(ran).toEqual([])
    app.demoClock!.moveTo(new Date(NOW.getTime() + 6 * 60_000))
    await runDueJobs(app)
    expect(ran).toHaveLength(2)
  })

  it('are left to whoever holds the lock, until its lease runs out', async () => {
    claimJob(app.db, 'one', 'another process', NOW, new Date(NOW.getTime() + 60_000))
    await runDueJobs(app)
    expect(ran.map(([name]) => name)).toEqual(['two'])
    app.demoClock!.moveTo(new Date(NOW.getTime() + 61_000))
    await runDueJobs(app)
    expect(ran.map(([name]) => name)).toContain('one')
  })

  it('stay locked when one who lost the lease lets go of them late', () => {
    const until = new Date(NOW.getTime() + 60_000)
    claimJob(app.db, 'one', 'the slow', NOW, until)
    claimJob(app.db, 'one', 'the next', new Date(until.getTime() + 1), new Date(until.getTime() + 60_000))
    releaseJob(app.db, 'one', 'the slow', { lastSuccessAt: NOW, lastFailure: null, retryAt: null })
    renewJob(app.db, 'one', 'the slow', NOW)
    expect(findJob(app.db, 'one')).toMatchObject({ lockedBy: 'the next', lockedUntil: new Date(until.getTime() + 60_000), lastSuccessAt: null })
  })

  it('keep the time before they do anything, so that a killed server does not go back', async () => {
    await runJobsUntil(app, new Date(NOW.getTime() + 30 * 60_000))
    expect(findDemoClock(app.db)).toEqual(new Date(NOW.getTime() + 30 * 60_000))
  })

  it('let others have their turn in between', async () => {
    let turns = 0
    const moving = runJobsUntil(app, new Date(NOW.getTime() + 3 * HOUR)).then(() => turns = -turns)
    while (turns >= 0 && turns < 1000) {
      await new Promise(resolve => setImmediate(resolve))
      turns++
    }
    await moving
    expect(turns).toBeLessThan(-4)
  })

  it('run once when the tick meets a move of the clock', async () => {
    await Promise.all([runJobsUntil(app, new Date(NOW.getTime() + 15 * 60_000)), runDueJobs(app), runDueJobs(app)])
    expect(ran).toEqual([['one', '10:00'], ['two', '10:00'], ['two', '10:10']])
  })

  it('are taken over from a killed server when its lease has run out, also while the clock is moved on', async () => {
    claimJob(app.db, 'one', 'a killed server', NOW, new Date(NOW.getTime() + 300_000))
    await runJobsUntil(app, new Date(NOW.getTime() + 8 * 60_000))
    expect(ran).toEqual([['two', '10:00'], ['one', '10:05']])
  })

  it('leave the clock to a server that has one', async () => {
    await expect(runJobsUntil({ ...app, demoClock: null }, NOW)).rejects.toThrow('Only the demo')
  })

  it('never move a clock back', () => {
    expect(() => app.demoClock!.moveTo(new Date(NOW.getTime() - 1))).toThrow(RangeError)
  })
})
