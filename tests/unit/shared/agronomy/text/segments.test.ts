import fc from 'fast-check'
import { SegmentedMessage } from 'sms-segments-calculator'
import { describe, expect, it } from 'vitest'
import { segments } from '../../../../../shared/agronomy/text/segments'

// sms-segments-calculator counts as the text service does.
describe('against sms-segments-calculator', () => {
  const letter = fc.constantFrom(...'abc XYZ09.,-', 'é', 'ü', 'Ø', '€', '[', ']', '{', '~', '|', '\\', '°', '’', '–', '😀', 'Ж')

  it('units, parts and encoding agree over 1,500 texts', () => {
    fc.assert(fc.property(fc.array(letter, { minLength: 1, maxLength: 400 }), (letters) => {
      const text = letters.join('')
      const theirs = new SegmentedMessage(text, 'auto', false)
      const ours = segments(text)
      expect([ours.encoding, ours.parts]).toEqual([theirs.encodingName, theirs.segmentsCount])
    }), { numRuns: 1500 })
  })
})

describe('segments', () => {
  it('name what forces the wide encoding, each once', () => {
    expect(segments('5 °C – 7 °C').forcedBy).toEqual(['°', '–'])
  })

  it('are one for an empty text', () => {
    expect(segments('')).toEqual({ encoding: 'GSM-7', units: 0, parts: 1, forcedBy: [] })
  })
})
