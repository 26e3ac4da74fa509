/**
 * What stands behind a number that Sillion shows: meaning, equation, source, and published values with the product's
 * own result beside them. Page and tests read the same entries, so neither can drift from the code.
 */
export interface Figure {
  /** address of its entry on the Figures page */
  id: string
  subject: 'weather' | 'rain' | 'soil' | 'crop' | 'spray' | 'machine' | 'plan' | 'text'
  name: string
  /** one sentence for a farmer */
  meaning: string
  /** in the notation of the source */
  equation: string
  sources: readonly string[]
  /** exported functions that it speaks for, as `file#name` under shared/agronomy */
  covers: readonly string[]
  checks: readonly Check[]
  /** what it does not know */
  unknown: string
  usualError: string
  caution?: string
}

/** A published value, and what the product makes of the same input, worked out when it is asked for. */
export interface Check {
  /** the input in words */
  of: string
  want: number | string
  /** how far the result may lie from it, in its unit; 0 for words and exact figures */
  within: number
  got: () => number | string
  /** document, section, table */
  cite: string
  /** why a residual remains */
  residual?: string
}

/** Terse rows: what, wanted, got, where it is printed, how close, and why no closer. */
export function check(of: string, want: number | string, got: () => number | string, cite: string, within = 0, residual?: string): Check {
  return { of, want, within, got, cite, ...(residual ? { residual } : {}) }
}

export interface Checked { ok: boolean, got: number | string, relativeError: number }

/** Compares a row with the product's own result. Words must be equal. */
export function run({ want, within, got }: Check): Checked {
  const value = got()
  if (typeof want === 'string' || typeof value === 'string') return { ok: value === want, got: value, relativeError: value === want ? 0 : 1 }
  const off = Math.abs(value - want)
  return { ok: off <= within + 1e-12 * Math.abs(want), got: value, relativeError: off / Math.max(Math.abs(want), 1e-9) }
}
