import type { FarmId, PersonId } from '../../shared/types/ids'
import { keepDemoClock } from '../db/queries/demo-clock'
import { listFarms } from '../db/queries/farms'
import { insertAudit } from '../db/queries/records'
import type { App } from './app'
import { announceChange } from './changes'
import { runJobsUntil } from './jobs'

let moving = false

/** Moves the demo on by some hours: forecasts arrive, rain falls, the crew works, each in its time. */
export async function moveDemoClock(app: App, hours: number, by: { farmId: FarmId, personId: PersonId }): Promise<{ outcome: 'moved', now: Date } | { outcome: 'moving' }> {
  if (moving) return { outcome: 'moving' }
  moving = true
  const before = app.clock.now()
  try {
    await runJobsUntil(app, new Date(before.getTime() + hours * 3_600_000))
  }
  finally {
    moving = false
  }
  const now = app.clock.now()
  app.db.transaction((tx) => {
    keepDemoClock(tx, now)
    insertAudit(tx, { ...by, at: now, action: 'moved', subject: 'demo-clock', subjectId: by.farmId, before: { now: before }, after: { now } })
  }, { behavior: 'immediate' })
  for (const farm of listFarms(app.db)) announceChange(farm.id)
  return { outcome: 'moved', now }
}
