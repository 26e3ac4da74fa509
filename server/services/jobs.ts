import { randomUUID } from 'node:crypto'
import { keepDemoClock } from '../db/queries/demo-clock'
import { claimJob, findJob, releaseJob, renewJob } from '../db/queries/jobs'
import type { App } from './app'
import type { DemoClock } from './clock'
import { log } from './log'

/** Work that falls due. It is only ever asked what is due, so that a stop of hours is caught up. */
export interface Job {
  name: string
  /** The next instant at which it is due, given when it last went well; null: never ran. */
  dueAt: (app: App, lastSuccessAt: Date | null) => Date
  /** Does the work as of `at`. Throws when it failed; what it did is then undone or harmless to repeat. */
  run: (app: App, at: Date) => Promise<void>
}

/** Who died over a job leaves it locked for so long; who lives renews its lease well before. */
const LEASE_MS = 60_000
const RENEW_MS = 15_000
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
      if (next.at > clock.now()) moveClock(app, clock, next.at)
      await runJob(app, next.job, clock.now())
      await othersFirst()
    }
    if (!stopping && until > clock.now()) moveClock(app, clock, until)
  })
}

/** The time is kept before anything is done in it, so that whatever ends the process can't set the demo back. */
function moveClock(app: App, clock: DemoClock, to: Date): void {
  clock.moveTo(to)
  keepDemoClock(app.db, to)
}

/** Lets whatever else waits have its turn: a move of a day is dozens of jobs in a row. */
export function othersFirst(): Promise<void> {
  return new Promise(resolve => setImmediate(resolve))
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
  const leaseEnd = () => new Date(app.clock.now().getTime() + LEASE_MS)
  if (!claimJob(app.db, job.name, worker, at, leaseEnd())) return
  const renewing = setInterval(() => renewJob(app.db, job.name, worker, leaseEnd()), RENEW_MS)
  let failure: string | null = null
  try {
    await job.run(app, at)
  }
  catch (error) {
    failure = error instanceof Error ? error.message : String(error)
    log('warn', 'A job failed.', { job: job.name, failure })
  }
  finally {
    clearInterval(renewing)
  }
  releaseJob(app.db, job.name, worker, failure === null
    ? { lastSuccessAt: at, lastFailure: null, retryAt: null }
    : { lastFailure: failure, retryAt: new Date(at.getTime() + RETRY_MS) })
}
