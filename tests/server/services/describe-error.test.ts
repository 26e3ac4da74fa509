import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { createError, isError } from 'h3'
import Database from 'better-sqlite3'
import { causesOf, describeError, type HandledError } from '../../../server/services/describe-error'
import { insertAudit } from '../../../server/db/queries/records'
import { fail } from '../../../server/utils/fail'
import { NOW, temporaryDatabase, type TemporaryDatabase } from '../temporary-database'

const caught = (work: () => unknown): HandledError => {
  try {
    work()
  }
  catch (error) {
    // h3 hands what was thrown to the error handler wrapped in an error of its own.
    const wrapped = createError(error as Error)
    wrapped.unhandled = !isError(error)
    return wrapped
  }
  throw new Error('Nothing was thrown.')
}

describe('describeError', () => {
  let temporary: TemporaryDatabase
  beforeEach(() => temporary = temporaryDatabase())
  afterEach(() => temporary.close())
  const write = (note = 'x') => temporary.db.transaction(tx => insertAudit(tx, { at: NOW, action: 'made', subject: 'field', subjectId: '1', after: { note } }), { behavior: 'immediate' })
  const rows = () => temporary.sqlite.prepare('select count(*) from audit_log').pluck().get()

  it('says that the disk is full, with nothing half-written, and writes again when there is room', () => {
    const pages = temporary.sqlite.pragma('page_count', { simple: true }) as number
    temporary.sqlite.pragma(`max_page_count = ${pages}`)
    expect(describeError(caught(() => write('x'.repeat(1_000_000))))).toMatchObject({ status: 507, code: 'disk-full' })
    expect(rows()).toBe(0)
    temporary.sqlite.pragma('max_page_count = 1000000')
    write()
    expect(rows()).toBe(1)
  })

  it('says that the database is busy when another holds it', () => {
    temporary.sqlite.pragma('busy_timeout = 20')
    const other = new Database(temporary.file)
    other.exec('begin immediate')
    expect(describeError(caught(write))).toMatchObject({ status: 503, code: 'busy' })
    other.exec('rollback')
    other.close()
    write()
    expect(rows()).toBe(1)
  })

  it('says that the database can’t be written', () => {
    temporary.sqlite.pragma('query_only = on')
    expect(describeError(caught(write))).toMatchObject({ status: 503, code: 'storage' })
  })

  it('passes on what a handler failed with', () => {
    expect(describeError(caught(() => fail(422, 'not-in-chain', 'This field does not get that pass.', 'pass')))).toEqual({ status: 422, code: 'not-in-chain', message: 'This field does not get that pass.', field: 'pass' })
  })

  it.each([
    ['a bug', new TypeError('Cannot read properties of undefined (reading \'hash\')')],
    ['an error with a path', new Error('ENOENT: no such file, open \'/srv/sillion/.data/x\'')],
    ['an error that pretends to have been told', Object.assign(new Error('select * from people'), { data: { code: 'x' } })],
  ])('tells nothing of %s', (_, error) => {
    const described = describeError(caught(() => {
      throw error
    }))
    expect(described).toMatchObject({ status: 500, code: 'internal' })
    expect(JSON.stringify(described)).not.toMatch(/hash|srv|people/)
  })

  it('tells nothing of a query that failed', () => {
    const described = describeError(caught(() => temporary.db.transaction(tx => insertAudit(tx, { at: NOW, action: 'made', subject: 'field', subjectId: null as unknown as string }))))
    expect(described).toMatchObject({ status: 500, code: 'internal' })
    expect(JSON.stringify(described)).not.toMatch(/audit_log|insert|NOT NULL/i)
  })

  it.each([[404, 'not-found'], [405, 'method'], [413, 'bad-request']])('puts the framework’s %i into our words', (statusCode, code) => {
    expect(describeError(createError({ statusCode, message: 'Page not found: /x' }))).toMatchObject({ status: statusCode, code, message: expect.not.stringContaining('/x') as string })
  })
})

describe('causesOf', () => {
  it('names each cause once, also in a circle', () => {
    const inner = new Error('inner')
    const outer = new Error('outer', { cause: inner })
    inner.cause = outer
    expect(causesOf(outer)).toBe('outer: inner')
  })
})
