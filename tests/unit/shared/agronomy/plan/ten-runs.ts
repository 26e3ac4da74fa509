/**
 * Ten made-up runs over six hours, mm in each hour, whose onsets were worked out by hand from the definition: the first
 * hour in which the sum since the start reaches 2.54 mm.
 */
export const TEN_RUNS = [
  [0, 0, 0.2, 1.5, 2, 0.5],
  [0, 0, 0, 0.6, 1.2, 1.5],
  [0, 0, 0, 0, 0, 0.3],
  [0.1, 0.4, 2.5, 1, 0, 0],
  [0, 0, 1, 1, 1, 1],
  [0, 0, 0, 2.6, 0.4, 0],
  [0, 0, 0, 0, 3, 2],
  [0, 0.2, 0.8, 1.2, 1, 0.2],
  [0, 0, 0, 0, 0.1, 0.2],
  [0, 0.5, 1.5, 3, 1, 0],
].map(run => Float64Array.from(run))

/** Hours counted from 1, as the definition's table has them; null: not within the six hours. */
export const TEN_ONSETS = [5, 6, null, 3, 5, 4, 5, 5, null, 4]
