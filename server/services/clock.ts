/**
 * The one place that asks the machine for the time. All other server code is given an instant or this clock.
 *
 * The demo's clock starts at the demo time and runs on at normal speed; it can be moved on, never back.
 */
export interface Clock {
  now: () => Date
}

export interface DemoClock extends Clock {
  /** Moves the clock to an instant that is not before now. */
  moveTo: (instant: Date) => void
}

/** When the demo begins: Tuesday 6 May 2025, 5:00 am at its first farm. */
export const DEMO_START = new Date('2025-05-06T10:00:00Z')

export const systemClock: Clock = { now: () => new Date(Date.now()) }

/** A clock that shows `start` now and runs on from there. */
export function createDemoClock(start: Date, machine: Clock = systemClock): DemoClock {
  let ahead = start.getTime() - machine.now().getTime()
  const now = () => new Date(machine.now().getTime() + ahead)
  return {
    now,
    moveTo(instant) {
      const step = instant.getTime() - now().getTime()
      if (step < 0) throw new RangeError('The demo clock moves on, never back.')
      ahead += step
    },
  }
}
