export default defineEventHandler(async (event) => {
  const { demoClock, now } = await requireFarm(event, 'demo-clock:move')
  if (!demoClock) fail(404, 'not-found', 'There is nothing here.')
  return { now: now.toISOString() }
})
