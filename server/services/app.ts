import type { Db, OpenDatabase } from '../db/client'
import type { Clock, DemoClock } from './clock'
import type { Settings } from './settings'

/** What the running server is made of. */
export interface App {
  settings: Settings
  db: Db
  sqlite: OpenDatabase['sqlite']
  clock: Clock
  /** the same clock where it can be moved; null outside the demo */
  demoClock: DemoClock | null
}

let current: App | null = null

/** Set once, when the server starts. */
export function setApp(app: App): void {
  current = app
}

/** @throws {Error} before the server has started */
export function useApp(): App {
  if (!current) throw new Error('The server has not started.')
  return current
}
