import { chmodSync, closeSync, copyFileSync, mkdtempSync, openSync, writeFileSync, writeSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { openDatabase } from '../../../server/db/client'
import { readMigrations } from '../../../server/db/migrations-module'
import { auditLog } from '../../../server/db/schema'
import { NOW, seedFarm, temporaryDatabase, type TemporaryDatabase } from '../temporary-database'

describe('openDatabase', () => {
  let temporary: TemporaryDatabase
  beforeEach(() => temporary = temporaryDatabase())
  afterEach(() => temporary.close())

  it('keeps what was written through a power cut: WAL and FULL, also after a write', () => {
    seedFarm(temporary.db, 'a')
    const pragma = (name: string) => temporary.sqlite.pragma(name, { simple: true })
    expect([pragma('journal_mode'), pragma('synchronous'), pragma('foreign_keys'), pragma('busy_timeout'), pragma('trusted_schema')]).toEqual(['wal', 2, 1, 5000, 0])
  })

  it('has only strict tables, which refuse text where a number belongs', () => {
    const tables = temporary.sqlite.prepare('select name, strict from pragma_table_list where schema = \'main\' and name not like \'sqlite_%\'').all() as { name: string, strict: number }[]
    expect(tables.length).toBeGreaterThan(15)
    expect(tables.filter(table => !table.strict)).toEqual([])
    expect(() => temporary.sqlite.prepare('insert into jobs (name, locked_until) values (\'x\', \'soon\')').run()).toThrow(/cannot store TEXT/)
  })

  it('can’t change or delete what the audit log says', () => {
    temporary.db.insert(auditLog).values({ at: NOW, action: 'made', subject: 'field', subjectId: '1' }).run()
    expect(() => temporary.sqlite.exec('update audit_log set action = \'other\'')).toThrow(/can't be changed/)
    expect(() => temporary.sqlite.exec('delete from audit_log')).toThrow(/can't be deleted/)
  })

  it('keeps a row from hanging under another farm', () => {
    seedFarm(temporary.db, 'a')
    seedFarm(temporary.db, 'b')
    expect(() => temporary.sqlite.exec('insert into pass_records (id, farm_id, field_id, pass, area_ac, started_at, ended_at, entered_at) values (\'1\', \'a\', \'b-0\', \'dig\', 1.0, 0, 0, 0)')).toThrow(/FOREIGN KEY/)
  })

  it('undoes a migration that fails half-way, and says so', () => {
    const broken = [...readMigrations(), { name: '9999_broken', sql: 'create table half (id integer primary key) strict; create table half (id integer primary key) strict;' }]
    expect(() => openDatabase(temporary.file, broken)).toThrow(/can't be brought up to date.*Nothing was changed/s)
    expect(temporary.sqlite.prepare('select count(*) from sqlite_schema where name = \'half\'').pluck().get()).toBe(0)
  })

  it('refuses a database of a newer version', () => {
    expect(() => openDatabase(temporary.file, readMigrations().slice(0, 1))).toThrow(/newer version/)
  })

  it('refuses a file that is no database', () => {
    const file = join(mkdtempSync(join(tmpdir(), 'sillion-db-')), 'sillion.db')
    writeFileSync(file, 'not a database at all, but long enough to be read as one'.repeat(100))
    expect(() => openDatabase(file, readMigrations())).toThrow(/can't be (opened|brought up to date)/)
  })

  it('refuses a database with a broken page, and says what to do', () => {
    seedFarm(temporary.db, 'a')
    temporary.sqlite.pragma('wal_checkpoint(TRUNCATE)')
    const file = join(temporary.folder, 'broken.db')
    copyFileSync(temporary.file, file)
    const pageBytes = temporary.sqlite.pragma('page_size', { simple: true }) as number
    const handle = openSync(file, 'r+')
    for (let page = 2; page < 12; page++) writeSync(handle, Buffer.alloc(pageBytes / 2, 0xA5), 0, pageBytes / 2, page * pageBytes)
    closeSync(handle)
    expect(() => openDatabase(file, readMigrations())).toThrow(/broken\.db is damaged.*Put back a copy/)
  })

  it('refuses a database whose tables came without the note that says so', () => {
    temporary.sqlite.exec('delete from migrations')
    expect(() => openDatabase(temporary.file, readMigrations())).toThrow(/can't be brought up to date.*already exists.*Nothing was changed/)
    expect(temporary.sqlite.prepare('select count(*) from migrations').pluck().get()).toBe(0)
  })

  it('refuses a folder that can’t be made', () => {
    const folder = mkdtempSync(join(tmpdir(), 'sillion-db-'))
    writeFileSync(join(folder, 'file'), '')
    chmodSync(folder, 0o755)
    expect(() => openDatabase(join(folder, 'file', 'sillion.db'), readMigrations())).toThrow(/can't be opened.*DATA_DIR/s)
  })
})
