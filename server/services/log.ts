import { systemClock } from './clock'

/** Keys whose values never reach the log. */
const SECRET = /password|cookie|token|secret|authorization|email|phone/i

/** One JSON object on a line of its own, with the machine's time and no secrets. */
export function log(level: 'info' | 'warn' | 'error', message: string, detail: Record<string, unknown> = {}): void {
  const safe = Object.fromEntries(Object.entries(detail).filter(([key]) => !SECRET.test(key)))
  process.stdout.write(`${JSON.stringify({ time: systemClock.now().toISOString(), level, message, ...safe })}\n`)
}
