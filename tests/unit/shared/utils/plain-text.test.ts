import { describe, expect, it } from 'vitest'
import { isPlainText } from '../../../../shared/utils/plain-text'

// Categories Cc and Cs of the Unicode Character Database; the directional controls are those of UAX #9, section 2.
describe('isPlainText', () => {
  it.each(['', 'North end, by Bo’s stones', 'Größe 40 ha\nzweite Zeile\tEnde', '🌾 שלום'])('takes %j', (text) => {
    expect(isPlainText(text)).toBe(true)
  })
  it.each(['\u0000', 'a\u0007b', '\u202Eevil', '\u2066x', '\uD83C'])('refuses %j', (text) => {
    expect(isPlainText(text)).toBe(false)
  })
})
