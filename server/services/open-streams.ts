import type { PersonId } from '../../shared/types/ids'

/** One page that listens for changes. */
export interface OpenStream { personId: PersonId, sessionId: string, close: () => void }

/** More tabs than anybody reads at once; what is above it would only hold connections. */
const MOST_PER_PERSON = 12
const streams = new Set<OpenStream>()
let stopping = false

/** @returns false, and nothing kept, when the person has too many open or the server is stopping */
export function keepStream(stream: OpenStream): boolean {
  const own = [...streams].filter(other => other.personId === stream.personId)
  if (stopping || own.length >= MOST_PER_PERSON) return false
  streams.add(stream)
  return true
}

export function dropStream(stream: OpenStream): void {
  streams.delete(stream)
}

/** Ends what a session still listens to, when it is signed out. */
export function closeStreamsOf(sessionId: string): void {
  for (const stream of [...streams]) if (stream.sessionId === sessionId) stream.close()
}

/** Ends all and takes no more: a stopping server waits for its connections. */
export function closeAllStreams(): void {
  stopping = true
  for (const stream of [...streams]) stream.close()
}
