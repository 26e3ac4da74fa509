import type { Ground as GroundWord, Pass } from '../../../shared/agronomy/ground'
import { groundAt, type FitMarks } from '../../../shared/agronomy/soil/fit'

/**
 * The word for a field's ground in an hour, for its next pass. Ground that is fit to till but too cold to plant is
 * called Cold: nothing is gained by opening it yet.
 */
export function groundWord(marks: FitMarks, hour: number, next: Pass): GroundWord {
  const word = groundAt(marks, hour, next)
  return word === 'fit' && (next === 'dig' || next === 'rocks') && marks.cold[hour] === 1 ? 'cold' : word
}

/** The words of all hours. */
export function groundWords(marks: FitMarks, next: Pass): GroundWord[] {
  return Array.from({ length: marks.hours }, (_, hour) => groundWord(marks, hour, next))
}

/** Hours in a row with the same word, as stretches. */
export function stretchesOf(words: readonly GroundWord[], at: (hour: number) => string): { from: string, to: string, ground: GroundWord }[] {
  const starts = words.flatMap((word, hour) => word === words[hour - 1] ? [] : [hour])
  return starts.map((from, i) => ({ from: at(from), to: at(starts[i + 1] ?? words.length), ground: words[from]! }))
}
