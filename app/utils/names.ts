import type { Ground, Pass } from '#shared/types/ground-order'

export const PASS_NAMES: Record<Pass, string> = { dig: 'Dig', rocks: 'Rocks', plant: 'Plant', roll: 'Roll', spray: 'Spray' }
export const GROUND_NAMES: Record<Ground, string> = { fit: 'Fit', close: 'Close', wet: 'Wet', cold: 'Cold', frozen: 'Frozen' }
