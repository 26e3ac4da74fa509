import { describe, expect, it } from 'vitest'
import { FIGURES } from '../../../../../shared/agronomy/figures'
import { run } from '../../../../../shared/agronomy/figures/figure'

describe.each(FIGURES)('$name', ({ checks }) => {
  it.each(checks.map(row => [`${row.of} = ${row.want} (${row.cite})`, row] as const))('%s', (_, row) => {
    const { ok, got } = run(row)
    expect(ok, `got ${got}, wanted ${row.want} within ${row.within}${row.residual ? ` (${row.residual})` : ''}`).toBe(true)
  })
})
