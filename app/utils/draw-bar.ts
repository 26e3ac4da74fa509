import type { Pass } from '#shared/types/ground-order'
import { round } from './time-axis'

const BODY = 12

/** Outline of a bar whose lower edge is what the machine leaves: teeth, bumps; the others are plain. */
export function barPath(pass: Pass, x: number, y: number, width: number): string {
  const right = round(x + width)
  const low = y + BODY
  if (pass === 'dig' && width >= 6) return `M${x} ${y}H${right}V${low}${edge(width, 3.2, step => `l${-step / 2} 3.8l${-step / 2} -3.8`)}Z`
  if (pass === 'rocks' && width >= 8) return `M${x} ${y}H${right}V${low}${edge(width, 4, step => `a${step / 2} 3.4 0 0 1 ${-step} 0`)}Z`
  return `M${x} ${y}H${right}V${low}H${x}Z`
}

function edge(width: number, half: number, one: (step: number) => string): string {
  const count = Math.max(1, Math.round(width / (2 * half)))
  return one(Math.round(width / count * 100) / 100).repeat(count)
}

/** Places of seeds or drops under a bar. */
export function marksUnder(x: number, width: number, every: number): number[] {
  const count = Math.max(1, Math.floor((width - 4) / every) + 1)
  return Array.from({ length: count }, (_, i) => round(x + 3.2 + i * every))
}
