import { join } from 'node:path'
import { openDatabase, type Db, type Migration } from '../db/client'
import { findDemoClock, keepDemoClock } from '../db/queries/demo-clock'
import { findLastSuccess } from '../db/queries/jobs'
import { countDemoPeople } from '../db/queries/people'
import { setApp } from './app'
import { createDemoClock, DEMO_START, systemClock } from './clock'
import { readSettings } from './settings'

/** How fakes in this process say that they are there, and read the server's clock. */
const FAKES = Symbol.for('sillion.fakes')
const CLOCK = Symbol.for('sillion.clock')
const KEEP_CLOCK_MS = 20_000

/**
 * Puts settings, database and clock in place.
 *
 * @param built - true in a built server
 * @returns what stops them again
 * @throws {Error} in plain words, when a setting, the database or what lies in it doesn't allow a start
 */
export function startApp(env: Record<string, string | undefined>, migrations: Migration[], built: boolean): () => void {
  const shared = globalThis as Record<symbol, unknown>
  const settings = readSettings(env, { fakesLoaded: shared[FAKES] === true, built })
  const { db, sqlite, close } = openDatabase(join(settings.dataDir, 'sillion.db'), migrations)
  if (settings.production && countDemoPeople(db) > 0) {
    close()
    throw new Error('Sillion can\'t start: the database holds the demo\'s people, whose password anybody can read. Use a database of your own (DATA_DIR).')
  }
  const demoClock = settings.demo ? createDemoClock(demoTime(db)) : null
  const clock = demoClock ?? systemClock
  shared[CLOCK] = clock.now
  setApp({ settings, db, sqlite, clock, demoClock })
  const keeping = demoClock ? setInterval(() => keepDemoClock(db, demoClock.now()), KEEP_CLOCK_MS) : null
  keeping?.unref()
  return () => {
    if (keeping) clearInterval(keeping)
    if (demoClock) keepDemoClock(db, demoClock.now())
    sqlite.pragma('wal_checkpoint(TRUNCATE)')
    close()
  }
}

/** Where the demo was left; never before work that is done already, or nothing would fall due for long. */
function demoTime(db: Db): Date {
  return new Date(Math.max(Number(findDemoClock(db) ?? DEMO_START), Number(findLastSuccess(db) ?? 0)))
}
