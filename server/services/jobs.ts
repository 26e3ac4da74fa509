import { randomUUID } from 'node:crypto'
import type { Db } from '../db/client'
import { claimJob, findJob, releaseJob } from '../db/queries/jobs'
import type { App } from './app'
import { log } from './log'

/** Work that falls due. It is only ever asked what is due, so that a stop of hours is caught up. */
export interface Job {
  name: string
  /** The next instant at which it is due, given when it last went well; null: never ran. */
  dueAt: (app: App, lastSuccessAt: Date | null) => Date
  /** Does the work as of `at`. Throws when it failed; what it did is then undone or harmless to repeat. */
  run: (app: App, at: Date) => Promise<void>
}

const LEASE_MS = 5 * 60_000
const RETRY_MS = 5 * 60_000
const jobs: Job[] = []
const worker = randomUUID()
/** The sweep that is running or ran last: sweeps of one process take turns. */
let turn: Promise<unknown> = Promise.resolve()
let sweeping = 0
let stopping = false

export function registerJob(job: Job): void {
  if (!jobs.some(other => other.name === job.name)) jobs.push(job)
}

/**
 * Runs what is due now, once each: a real clock does not go back to hours that were missed. Does nothing while
 * another sweep runs; the next tick asks again.
 */
export async function runDueJobs(app: App): Promise<void> {
  if (sweeping > 0) return
  await inTurn(async () => {
    for (const job of jobs) if (!stopping && dueAt(app, job) <= app.clock.now()) await runJob(app, job, app.clock.now())
  })
}

/**
 * Moves the demo's clock on, running every job at the time it falls due, in order. When the server is stopping, the
 * clock stays at the job that was last.
 * @throws {Error} when the app has no clock that can be moved
 */
export async function runJobsUntil(app: App, until: Date): Promise<void> {
  const clock = app.demoClock
  if (!clock) throw new Error('Only the demo\'s clock can be moved.')
  await inTurn(async () => {
    while (!stopping) {
      const next = jobs.map(job => ({ job, at: dueAt(app, job) })).sort((a, b) => a.at.getTime() - b.at.getTime())[0]
      if (!next || next.at > until) break
      if (next.at > clock.now()) clock.moveTo(next.at)
      await runJob(app, next.job, clock.now())
    }
    if (!stopping && until > clock.now()) clock.moveTo(until)
  })
}

/** Starts no job any more, and waits for the one that runs. */
export async function stopJobs(): Promise<void> {
  stopping = true
  await turn
}

function inTurn(sweep: () => Promise<void>): Promise<void> {
  sweeping++
  const mine = turn.then(sweep).finally(() => sweeping--)
  turn = mine.catch(() => undefined)
  return mine
}

function dueAt(app: App, job: Job): Date {
  const row = findJob(app.db, job.name)
  const times = [job.dueAt(app, row?.lastSuccessAt ?? null)]
  // After a failure it is tried again a little later, not at every tick.
  if (row?.retryAt) times.push(row.retryAt)
  // Whoever holds the lock does the work, until the lease says that it died over it.
  if (row?.lockedUntil && row.lockedBy !== worker) times.push(row.lockedUntil)
  return new Date(Math.max(...times.map(Number)))
}

/** Holds the job's lock while it runs, so that two processes on one database do the work once. */
async function runJob(app: App, job: Job, at: Date): Promise<void> {
  if (!claimJob(app.db, job.name, worker, at, new Date(at.getTime() + LEASE_MS))) return
  let failure: string | null = null
  try {
    await job.run(app, at)
  }
  catch (error) {
    failure = error instanceof Error ? error.message : String(error)
    log('warn', 'A job failed.', { job: job.name, failure })
  }
  finish(app.db, job.name, at, failure)
}

function finish(db: Db, name: string, at: Date, failure: string | null): void {
  releaseJob(db, name, failure === null
    ? { lastSuccessAt: at, lastFailure: null, retryAt: null }
    : { lastFailure: failure, retryAt: new Date(at.getTime() + RETRY_MS) })
}
