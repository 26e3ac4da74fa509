import type { Outcome } from './weather-gateway'

const FAILURES_TO_OPEN = 5
const PROBE_EVERY_MS = 5 * 60_000

/** Leaves a service alone after five failures in a row, and tries it again every five minutes. */
export class Breaker {
  private failures = 0
  private openedAt = 0

  constructor(private readonly now: () => Date) {}

  async call<Value>(work: () => Promise<Outcome<Value>>): Promise<Outcome<Value>> {
    if (this.failures >= FAILURES_TO_OPEN && this.now().getTime() - this.openedAt < PROBE_EVERY_MS) {
      return { ok: false, trouble: 'The weather service has failed several times; we are leaving it alone for a few minutes.' }
    }
    const outcome = await work()
    this.failures = outcome.ok ? 0 : this.failures + 1
    if (this.failures >= FAILURES_TO_OPEN) this.openedAt = this.now().getTime()
    return outcome
  }
}
