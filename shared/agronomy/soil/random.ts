/** A source of numbers from 0 (with) to 1 (without). */
export type Random = () => number

/**
 * Repeatable random numbers: mulberry32. The same seed gives the same row on every machine.
 * @param seed - any whole number
 */
export function seededRandom(seed: number): Random {
  let state = seed >>> 0
  return () => {
    state = (state + 0x6D2B79F5) >>> 0
    let t = Math.imul(state ^ (state >>> 15), 1 | state)
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t
    return ((t ^ (t >>> 14)) >>> 0) / 4_294_967_296
  }
}

/** A standard normal number (Box & Muller 1958). */
export function normalNumber(random: Random): number {
  return Math.sqrt(-2 * Math.log(1 - random())) * Math.cos(2 * Math.PI * random())
}
