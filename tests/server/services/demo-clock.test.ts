import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { findDemoClock } from '../../../server/db/queries/demo-clock'
import { auditLog } from '../../../server/db/schema'
import type { App } from '../../../server/services/app'
import { onChange } from '../../../server/services/changes'
import { createDemoClock } from '../../../server/services/clock'
import { moveDemoClock } from '../../../server/services/demo-clock'
import { registerJob } from '../../../server/services/jobs'
import { readSettings } from '../../../server/services/settings'
import type { FarmId, PersonId } from '../../../shared/types/ids'
import { NOW, seedFarm, temporaryDatabase, type TemporaryDatabase } from '../temporary-database'

const HOUR = 3_600_000
const ran: string[] = []
registerJob({
  name: 'hourly',
  dueAt: (_, last) => new Date(last ? last.getTime() + HOUR : NOW.getTime() + HOUR),
  run: async (_, at) => void ran.push(at.toISOString()),
})

describe('moveDemoClock', () => {
  let temporary: TemporaryDatabase
  let app: App
  let farmId: FarmId
  let by: { farmId: FarmId, personId: PersonId }
  beforeEach(() => {
    temporary = temporaryDatabase()
    farmId = seedFarm(temporary.db, 'a')
    by = { farmId, personId: 'person-a' as PersonId }
    const demoClock = createDemoClock(NOW, { now: () => new Date(0) })
    app = { db: temporary.db, sqlite: temporary.sqlite, clock: demoClock, demoClock, settings: readSettings({ NUXT_SESSION_PASSWORD: 'x'.repeat(40) }, { fakesLoaded: false, built: false }) }
    ran.length = 0
  })
  afterEach(() => temporary.close())

  it('runs what falls due on the way, keeps the time for the next start, and tells open pages once', async () => {
    let heard = 0
    const stop = onChange(farmId, () => heard++)
    expect(await moveDemoClock(app, 6, by)).toEqual({ outcome: 'moved', now: new Date(NOW.getTime() + 6 * HOUR) })
    stop()
    expect(ran).toEqual(['2025-05-06T11:00:00.000Z', '2025-05-06T12:00:00.000Z', '2025-05-06T13:00:00.000Z', '2025-05-06T14:00:00.000Z', '2025-05-06T15:00:00.000Z', '2025-05-06T16:00:00.000Z'])
    expect(findDemoClock(temporary.db)).toEqual(new Date(NOW.getTime() + 6 * HOUR))
    expect(heard).toBe(1)
    expect(temporary.db.select().from(auditLog).all()).toMatchObject([{ ...by, at: new Date(NOW.getTime() + 6 * HOUR), action: 'moved', subject: 'demo-clock', before: { now: NOW.toISOString() } }])
  })

  it('moves once at a time', async () => {
    const [first, second] = await Promise.all([moveDemoClock(app, 1, by), moveDemoClock(app, 24, by)])
    expect([first.outcome, second.outcome]).toEqual(['moved', 'moving'])
    expect(app.clock.now()).toEqual(new Date(NOW.getTime() + HOUR))
  })
})
