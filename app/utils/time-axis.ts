/** The time axis that everything hangs from: linear, hours to pixels. */
export interface TimeAxis {
  /** left end, an instant */
  startsAt: string
  hours: number
  pxPerHour: number
}

export const DESK_PX_PER_HOUR = 6.8
export const PHONE_PX_PER_HOUR = 5.4

/** x of an instant, px from the left end; not cut to the axis. */
export function xOf(axis: TimeAxis, instant: string): number {
  return round((Date.parse(instant) - Date.parse(axis.startsAt)) / 3_600_000 * axis.pxPerHour)
}

/** x of an instant, cut to the axis. */
export function xWithin(axis: TimeAxis, instant: string): number {
  return Math.min(widthOf(axis), Math.max(0, xOf(axis, instant)))
}

export function widthOf(axis: TimeAxis): number {
  return round(axis.hours * axis.pxPerHour)
}

/** Room for words behind something that ends at an instant, px: up to what comes next, and never across the rain line. */
export function roomAfter(axis: TimeAxis, end: string, next: string | null, rainAt: string | null): number {
  const stops = [widthOf(axis), ...[next, rainAt].flatMap(stop => stop !== null && stop >= end ? [xOf(axis, stop)] : [])]
  return round(Math.min(...stops) - xOf(axis, end))
}

/** Width that a label on or beside a bar needs, px. */
export function widthOfWords(words: string): number {
  return words.length * 5.6 + 8
}

/** Tenths of a pixel keep the page small and the server's drawing equal to the browser's. */
export function round(value: number): number {
  return Math.round(value * 10) / 10
}
