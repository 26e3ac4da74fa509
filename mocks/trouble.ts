import { readFileSync } from 'node:fs'

/** Ways in which the invented weather service can fail. */
export const TROUBLES = [
  'refused', 'hang', 'drip', '500', '503', '429', 'html', 'truncated', 'empty-array', 'wrong-units', 'stale-timestamps', 'future-timestamps', 'huge', 'redirect', 'implausible',
] as const
export type Trouble = (typeof TROUBLES)[number]

let set: Trouble | null = null

/** Makes every following answer fail in one way; null: answer properly again. */
export function setTrouble(trouble: Trouble | null): void {
  set = trouble
}

/** The way in force: as set, or as the file named by SILLION_WEATHER_TROUBLE says, which is read anew each time. */
export function troubleInForce(): Trouble | null {
  if (set) return set
  const file = process.env.SILLION_WEATHER_TROUBLE
  if (!file) return null
  try {
    const word = readFileSync(file, 'utf8').trim()
    return TROUBLES.find(trouble => trouble === word) ?? null
  }
  catch {
    return null
  }
}
