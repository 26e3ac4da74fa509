import { groundOrder } from '../../../services/ground-order/ground-order'

export default defineEventHandler(async (event) => {
  const { db, farm, now } = await requireFarm(event, 'farm:see')
  return groundOrder(db, farm, now)
})
