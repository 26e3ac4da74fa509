import type { App } from './app'
import { announceChange } from './changes'
import { listFarms } from '../db/queries/farms'
import { keepDemoClock } from '../db/queries/demo-clock'
import { runJobsUntil } from './jobs'

let moving = false

/** Moves the demo on by some hours: forecasts arrive, rain falls, the crew works, each in its time. */
export async function moveDemoClock(app: App, hours: number): Promise<{ outcome: 'moved', now: Date } | { outcome: 'moving' }> {
  if (moving) return { outcome: 'moving' }
  moving = true
  try {
    await runJobsUntil(app, new Date(app.clock.now().getTime() + hours * 3_600_000))
  }
  finally {
    moving = false
  }
  const now = app.clock.now()
  keepDemoClock(app.db, now)
  for (const farm of listFarms(app.db)) announceChange(farm.id)
  return { outcome: 'moved', now }
}
