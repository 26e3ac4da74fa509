/** Repeatable noise: the same keys give the same numbers, so any hour of the invented season can be asked for alone. */

/** A number from 0 to 1 (neither) that depends on nothing but the keys. */
export function uniform(...keys: number[]): number {
  let h = 0x9E3779B9
  for (const key of keys) {
    h = Math.imul(h ^ (key | 0), 0x85EBCA6B)
    h ^= h >>> 13
    h = Math.imul(h ^ Math.floor(key / 4_294_967_296), 0xC2B2AE35)
    h ^= h >>> 16
  }
  h = Math.imul(h ^ (h >>> 15), 0x27D4EB2F)
  return (((h ^ (h >>> 13)) >>> 0) + 0.5) / 4_294_967_296
}

/** A standard normal number (Box & Muller). */
export function normal(...keys: number[]): number {
  return Math.sqrt(-2 * Math.log(uniform(1, ...keys))) * Math.cos(2 * Math.PI * uniform(2, ...keys))
}

/** Noise of standard deviation 1 that wanders with time: normal numbers at every `step`, joined smoothly. */
export function wandering(time: number, step: number, ...keys: number[]): number {
  const x = time / step
  const before = Math.floor(x)
  const angle = (x - before) * Math.PI / 2
  // The squares of the weights add up to 1, so the spread is the same at every time.
  return Math.cos(angle) * normal(before, ...keys) + Math.sin(angle) * normal(before + 1, ...keys)
}
