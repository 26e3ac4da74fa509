import { ClockMove } from '#shared/schemas/demo-clock'
import { moveDemoClock } from '../../../../services/demo-clock'

export default defineEventHandler(async (event) => {
  const context = await requireFarm(event, 'demo-clock:move')
  if (!context.demoClock) fail(404, 'not-found', 'There is nothing here.')
  const { hours } = await readBodyAs(event, ClockMove)
  const moved = await moveDemoClock(context, hours, { farmId: context.farm.id, personId: context.person.id })
  if (moved.outcome === 'moving') fail(409, 'moving', 'The clock is being moved on already. Wait for it.')
  return { now: moved.now.toISOString() }
})
