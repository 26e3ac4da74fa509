import { z } from 'zod'

export const ClockMove = z.strictObject({
  hours: z.union([z.literal(1), z.literal(6), z.literal(24)], { error: 'The clock moves on by 1, 6 or 24 hours.' }),
})
