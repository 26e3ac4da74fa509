import { readFileSync, readdirSync } from 'node:fs'
import type { Migration } from './client'

/** The SQL files of drizzle/, in order. For the build and for tests; the built server has them in `#migrations`. */
export function readMigrations(): Migration[] {
  const folder = new URL('../../drizzle/', import.meta.url)
  return readdirSync(folder)
    .filter(name => name.endsWith('.sql'))
    .sort()
    .map(name => ({ name: name.replace(/\.sql$/, ''), sql: readFileSync(new URL(name, folder), 'utf8') }))
}

/** Source of the virtual module `#migrations`. */
export function migrationsModule(): string {
  return `export const migrations = ${JSON.stringify(readMigrations())}`
}
