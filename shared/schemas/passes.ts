import { z } from 'zod'
import { PASSES } from '../agronomy/ground'
import { isPlainText } from '../utils/plain-text'

/** Longest that work is written down in one go; two days in a row are two entries. */
const LONGEST_MS = 48 * 3_600_000

/** Acres worked in one go. */
export const NewPassRecord = z.strictObject({
  pass: z.enum(PASSES, { error: 'The pass is dig, rocks, plant, roll or spray.' }),
  areaAc: z.number({ error: 'Enter the acres as a number.' }).positive('Acres must be more than 0.').min(0.01, 'Acres must be at least 0.01.').max(100_000, 'That is more than any field has.'),
  machineId: z.string().min(1).max(100).nullable().default(null),
  startedAt: z.iso.datetime({ offset: true, error: 'The start must be a date and time.' }),
  endedAt: z.iso.datetime({ offset: true, error: 'The end must be a date and time.' }),
  note: z.string().trim().max(1000, 'A note can have 1,000 characters at most.').refine(isPlainText, 'The note holds characters that can\'t be shown.').nullable().default(null),
}).refine(record => Date.parse(record.endedAt) > Date.parse(record.startedAt), { error: 'The end is not after the start.', path: ['endedAt'] })
  .refine(record => Date.parse(record.endedAt) - Date.parse(record.startedAt) <= LONGEST_MS, { error: 'The start is more than two days before the end. Check the date.', path: ['startedAt'] })
