import { mkdirSync } from 'node:fs'
import { dirname } from 'node:path'
import Database from 'better-sqlite3'
import { drizzle, type BetterSQLite3Database } from 'drizzle-orm/better-sqlite3'
import * as schema from './schema'

export type Db = BetterSQLite3Database<typeof schema>
/** Inside a transaction: what a query takes, so that it works both alone and as a part of something larger. */
export type DbOrTransaction = Db | Parameters<Parameters<Db['transaction']>[0]>[0]
export interface Migration { name: string, sql: string }
export interface OpenDatabase { db: Db, sqlite: Database.Database, close: () => void }

/**
 * Opens the database file, makes it durable and brings it up to date, all before the first query.
 *
 * A migration and the note that it ran are one transaction, so a stop half-way leaves the old state.
 *
 * @throws {Error} in one plain sentence when the folder can't be written, the file is damaged or comes from a
 *   newer version, or a migration fails; nothing is changed then
 */
export function openDatabase(file: string, migrations: Migration[]): OpenDatabase {
  const sqlite = open(file)
  try {
    refuseDamaged(sqlite, file)
    migrate(sqlite, file, migrations)
  }
  catch (error) {
    sqlite.close()
    throw error
  }
  return { db: drizzle(sqlite, { schema, casing: 'snake_case' }), sqlite, close: () => sqlite.close() }
}

function open(file: string): Database.Database {
  try {
    mkdirSync(dirname(file), { recursive: true })
    const sqlite = new Database(file)
    sqlite.pragma('journal_mode = WAL')
    // better-sqlite3 is built to fall back to NORMAL in WAL mode; a person who saw 'saved' needs FULL.
    sqlite.pragma('synchronous = FULL')
    sqlite.pragma('foreign_keys = ON')
    sqlite.pragma('busy_timeout = 5000')
    sqlite.pragma('trusted_schema = OFF')
    return sqlite
  }
  catch (cause) {
    throw new Error(`The database ${file} can't be opened: ${describe(cause)} Check that DATA_DIR exists, can be written and has room.`, { cause })
  }
}

function refuseDamaged(sqlite: Database.Database, file: string): void {
  const [found] = sqlite.prepare('pragma quick_check(1)').pluck().all() as string[]
  if (found !== 'ok') throw new Error(`The database ${file} is damaged (${found?.replaceAll(/\s+/g, ' ')}). Put back a copy of it, or move it away to start with an empty one.`)
}

function migrate(sqlite: Database.Database, file: string, migrations: Migration[]): void {
  const known = new Set(migrations.map(migration => migration.name))
  const migrateAll = sqlite.transaction(() => {
    sqlite.exec('create table if not exists migrations (name text primary key, ran_at integer not null) strict')
    const ran = new Set(sqlite.prepare('select name from migrations').pluck().all() as string[])
    const unknown = [...ran].find(name => !known.has(name))
    if (unknown) throw new Error(`it was last used by a newer version (its migration ${unknown} is not known here).`)
    for (const { name, sql } of migrations.filter(migration => !ran.has(migration.name))) {
      sqlite.exec(sql)
      sqlite.prepare('insert into migrations (name, ran_at) values (?, unixepoch() * 1000)').run(name)
    }
  })
  try {
    migrateAll.immediate()
  }
  catch (cause) {
    throw new Error(`The database ${file} can't be brought up to date: ${describe(cause)} Nothing was changed.`, { cause })
  }
}

function describe(error: unknown): string {
  const message = error instanceof Error ? error.message : String(error)
  return message.endsWith('.') ? message : `${message}.`
}
