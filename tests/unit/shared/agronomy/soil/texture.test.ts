import { describe, expect, it } from 'vitest'
import { TEXTURE_CLASSES, textureClass, type TextureClass } from '../../../../../shared/agronomy/soil/texture'

/** The published boundaries, each on its own (Benham, Ahrens & Nettleton 2009), for the whole-number points. */
const BOUNDARIES: Record<TextureClass, (sand: number, silt: number, clay: number) => boolean> = {
  'sand': (_, silt, clay) => silt + 1.5 * clay < 15,
  'loamy sand': (_, silt, clay) => silt + 1.5 * clay >= 15 && silt + 2 * clay < 30,
  'sandy loam': (sand, silt, clay) => (clay >= 7 && clay < 20 && sand > 52 && silt + 2 * clay >= 30) || (clay < 7 && silt < 50 && silt + 2 * clay >= 30),
  'loam': (sand, silt, clay) => clay >= 7 && clay < 27 && silt >= 28 && silt < 50 && sand <= 52,
  'silt loam': (_, silt, clay) => (silt >= 50 && clay >= 12 && clay < 27) || (silt >= 50 && silt < 80 && clay < 12),
  'silt': (_, silt, clay) => silt >= 80 && clay < 12,
  'sandy clay loam': (sand, silt, clay) => clay >= 20 && clay < 35 && silt < 28 && sand > 45,
  'clay loam': (sand, _, clay) => clay >= 27 && clay < 40 && sand > 20 && sand <= 45,
  'silty clay loam': (sand, _, clay) => clay >= 27 && clay < 40 && sand <= 20,
  'sandy clay': (sand, _, clay) => clay >= 35 && sand > 45,
  'silty clay': (_, silt, clay) => clay >= 40 && silt >= 40,
  'clay': (sand, silt, clay) => clay >= 40 && sand <= 45 && silt < 40,
}

describe('textureClass', () => {
  // Saxton & Rawls (2006) Table 3: each class centroid belongs to its own class.
  it.each([
    [88, 5, 'sand'], [80, 5, 'loamy sand'], [65, 10, 'sandy loam'], [40, 20, 'loam'], [20, 15, 'silt loam'], [10, 5, 'silt'],
    [60, 25, 'sandy clay loam'], [30, 35, 'clay loam'], [10, 35, 'silty clay loam'], [10, 45, 'silty clay'], [50, 40, 'sandy clay'], [25, 50, 'clay'],
  ])('sand %s clay %s is %s', (sandPct, clayPct, name) => {
    expect(textureClass(sandPct, clayPct)).toBe(name)
  })

  // Edges of the published rules; 100 − 45.1 − 27 is 27.900000000000006 in binary.
  it.each([[45, 27, 'clay loam'], [45.1, 27, 'sandy clay loam'], [52, 7, 'loam'], [0, 12, 'silt loam']])('on an edge, sand %s clay %s is %s', (sandPct, clayPct, name) => {
    expect(textureClass(sandPct, clayPct)).toBe(name)
  })

  it('agrees with the published boundaries on all 5,151 whole-number points, the first that holds', () => {
    let points = 0
    for (let clay = 0; clay <= 100; clay++) {
      for (let sand = 0; sand <= 100 - clay; sand++) {
        points++
        const expected = TEXTURE_CLASSES.find(name => BOUNDARIES[name](sand, 100 - sand - clay, clay))
        expect(textureClass(sand, clay), `sand ${sand} clay ${clay}`).toBe(expected)
      }
    }
    expect(points).toBe(5151)
  })

  it('refuses shares that are no soil', () => {
    expect(() => textureClass(60, 41)).toThrow(RangeError)
    expect(() => textureClass(-1, 20)).toThrow(RangeError)
    expect(() => textureClass(Number.NaN, 20)).toThrow(RangeError)
  })
})
