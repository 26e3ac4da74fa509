import { EventEmitter } from 'node:events'
import type { FarmId } from '../../shared/types/ids'

/** Tells open pages of a farm that something changed. In this process only; the pages then ask for the data anew. */
const changes = new EventEmitter().setMaxListeners(0)

export function announceChange(farmId: FarmId): void {
  changes.emit(farmId)
}

/** @returns what stops listening */
export function onChange(farmId: FarmId, listener: () => void): () => void {
  changes.on(farmId, listener)
  return () => changes.off(farmId, listener)
}
