/** What a client is told of a failure. */
export interface Described { status: number, code: string, message: string, field?: string }

/** SQLite codes that are the machine's trouble, with what the client should be told. */
const STORAGE: [RegExp, Described][] = [
  [/^SQLITE_FULL/, { status: 507, code: 'disk-full', message: 'The disk is full, so nothing was saved. Free some room, then try again.' }],
  [/^SQLITE_(BUSY|LOCKED)/, { status: 503, code: 'busy', message: 'The database is busy, so nothing was saved. Try again in a moment.' }],
  [/^SQLITE_(READONLY|IOERR|CANTOPEN|PERM)/, { status: 503, code: 'storage', message: 'The database can\'t be written, so nothing was saved. Try again later.' }],
  [/^SQLITE_(CORRUPT|NOTADB)/, { status: 503, code: 'storage', message: 'The database is damaged. Whoever runs this server must put back a copy.' }],
]
const INTERNAL: Described = { status: 500, code: 'internal', message: 'Something went wrong on our side; nothing was saved. Try again, and quote the request id if it stays.' }

/** An error as h3 hands it to the error handler. */
export type HandledError = Error & { statusCode?: number, data?: unknown, unhandled?: boolean }

/** Tells a client what failed in plain words, and nothing of the inside. */
export function describeError(error: HandledError): Described {
  const storage = STORAGE.find(([pattern]) => codesOf(error).some(code => pattern.test(code)))
  if (storage) return storage[1]
  const status = error.unhandled ? 500 : error.statusCode ?? 500
  const data = error.data as { code?: string, field?: string } | undefined
  if (data?.code && !error.unhandled) return { status, code: data.code, message: error.message, field: data.field }
  if (status === 404) return { status, code: 'not-found', message: 'There is nothing here.' }
  if (status === 405) return { status, code: 'method', message: 'This address does not do that.' }
  if (status >= 400 && status < 500) return { status, code: 'bad-request', message: 'The request can\'t be understood.' }
  return INTERNAL
}

/** Error and all its causes in one line, for the log. */
export function causesOf(error: unknown): string {
  return chainOf(error).map(link => link instanceof Error ? link.message : String(link)).join(': ')
}

function codesOf(error: unknown): string[] {
  return chainOf(error).map(link => (link as { code?: unknown }).code).filter(code => typeof code === 'string')
}

function chainOf(error: unknown): unknown[] {
  const chain: unknown[] = []
  for (let link = error; link !== undefined && link !== null && !chain.includes(link); link = (link as { cause?: unknown }).cause) chain.push(link)
  return chain
}
