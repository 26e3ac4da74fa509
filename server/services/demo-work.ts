import { PASSES } from '../../shared/agronomy/ground'
import type { GroundRow } from '../../shared/types/ground-order'
import type { FieldId, PassRecordId } from '../../shared/types/ids'
import type { DbOrTransaction } from '../db/client'
import { listFarms, updateRevision, type Farm } from '../db/queries/farms'
import { updateMachinePlace } from '../db/queries/machines'
import { insertPassRecord } from '../db/queries/pass-records'
import { insertAudit } from '../db/queries/records'
import type { App } from './app'
import { announceChange } from './changes'
import { groundOrder } from './ground-order/ground-order'
import { othersFirst, type Job } from './jobs'

const HOUR_MS = 3_600_000
/** Acres under which nobody drives out. */
const LEAST_AC = 0.01

/**
 * Only in the demo: each hour, the invented crew has done what the order had it do in the hour before.
 *
 * It follows the order of an hour ago, so it works in its machines' hours and on ground that was fit.
 */
export const demoWorkJob: Job = {
  name: 'demo:work',
  dueAt: (_, lastSuccessAt) => lastSuccessAt ? new Date((Math.floor(lastSuccessAt.getTime() / HOUR_MS) + 1) * HOUR_MS) : new Date(0),
  async run(app, at) {
    for (const farm of listFarms(app.db)) {
      workHour(app, farm, new Date(Math.floor(at.getTime() / HOUR_MS) * HOUR_MS))
      await othersFirst()
    }
  },
}

function workHour(app: App, farm: Farm, hour: Date): void {
  const from = new Date(hour.getTime() - HOUR_MS)
  const order = groundOrder(app.db, farm, from)
  app.db.transaction((tx) => {
    let worked = false
    for (const row of order.rows) worked = workRow(tx, farm, row, order.machines, from, hour) || worked
    if (worked) updateRevision(tx, farm.id)
  }, { behavior: 'immediate' })
  announceChange(farm.id)
}

/** Each pass gets the acres that its bars cover within the hour. */
function workRow(tx: DbOrTransaction, farm: Farm, row: GroundRow, machines: { id: string, rateAcPerHour: number | null }[], from: Date, to: Date): boolean {
  let worked = false
  for (const pass of PASSES) {
    let leftAc = row.areaAc - row.chain.find(item => item.pass === pass)!.doneAc
    for (const bar of row.bars.filter(item => item.pass === pass)) {
      const startedAt = Math.max(Date.parse(bar.from), from.getTime())
      const endedAt = Math.min(Date.parse(bar.to), to.getTime())
      const rate = machines.find(machine => machine.id === bar.machineId)?.rateAcPerHour ?? 0
      const areaAc = Math.min(leftAc, (endedAt - startedAt) / HOUR_MS * rate)
      if (!(areaAc > LEAST_AC)) continue
      const record = insertPassRecord(tx, {
        id: `demo-${row.id}-${pass}-${startedAt}` as PassRecordId, farmId: farm.id, fieldId: row.id as FieldId, machineId: bar.machineId, pass, areaAc,
        startedAt: new Date(startedAt), endedAt: new Date(endedAt), note: 'Invented: the demo\'s crew.', enteredAt: to,
      })
      insertAudit(tx, { farmId: farm.id, personId: null, at: to, action: 'logged', subject: 'pass', subjectId: record.id, before: { doneAc: row.areaAc - leftAc }, after: record })
      updateMachinePlace(tx, farm.id, bar.machineId, row.id)
      leftAc -= areaAc
      worked = true
    }
  }
  return worked
}
