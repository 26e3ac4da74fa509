import { randomBytes, scrypt, timingSafeEqual, type ScryptOptions } from 'node:crypto'
import { dictionary } from '@zxcvbn-ts/language-common'

/** scrypt at N = 2^14, r = 8, p = 5 (OWASP Password Storage Cheat Sheet). */
const COST = { N: 2 ** 14, r: 8, p: 5 }
const KEY_BYTES = 32
const MEMORY = 64 * 1024 * 1024
/** NIST SP 800-63B-4: at least 15 where the password is the only factor. Far more is allowed, but not without end. */
export const LEAST_PASSWORD_LENGTH = 15
const MOST_PASSWORD_LENGTH = 512

/** One hash at a time: it takes a core for a tenth of a second, and other requests want one too. */
let queue: Promise<unknown> = Promise.resolve()
let waiting = 0
/** Hashes that may wait: the last of them takes some seconds, and a person waits no longer. */
const MOST_WAITING = 20

/** True when so many hashes wait that another would only make all of them late. */
export function isHashingBusy(): boolean {
  return waiting >= MOST_WAITING
}

function derive(password: string, salt: Buffer, options: ScryptOptions): Promise<Buffer> {
  waiting++
  const next = queue.then(() => new Promise<Buffer>((resolve, reject) => {
    scrypt(password.normalize('NFKC'), salt, KEY_BYTES, { ...options, maxmem: MEMORY }, (error, key) => error ? reject(error) : resolve(key))
  }))
  queue = next.catch(() => undefined).then(() => waiting--)
  return next
}

/** @returns `scrypt$N$r$p$salt$key`, base64url */
export async function hashPassword(password: string): Promise<string> {
  const salt = randomBytes(16)
  const key = await derive(password, salt, COST)
  return ['scrypt', COST.N, COST.r, COST.p, salt.toString('base64url'), key.toString('base64url')].join('$')
}

/** What an unknown e-mail is checked against, so that it takes as long as a known one. */
export const NOBODYS_HASH = `scrypt$${COST.N}$${COST.r}$${COST.p}$${Buffer.alloc(16).toString('base64url')}$${Buffer.alloc(KEY_BYTES).toString('base64url')}`

export async function isPassword(password: string, hash: string): Promise<boolean> {
  const [kind, n, r, p, salt, key] = hash.split('$')
  if (kind !== 'scrypt' || !salt || !key) throw new Error('A password hash is of an unknown kind.')
  const wanted = Buffer.from(key, 'base64url')
  const found = await derive(password, Buffer.from(salt, 'base64url'), { N: Number(n), r: Number(r), p: Number(p) })
  return timingSafeEqual(wanted, found)
}

/** True when a hash is cheaper to break than today's. */
export function isWeakHash(hash: string): boolean {
  const [, n, r, p] = hash.split('$').map(Number)
  return !(n! * r! * p! >= COST.N * COST.r * COST.p)
}

const common = new Set(dictionary.passwords.map((password: string | number) => String(password).toLowerCase()))

/**
 * What is wrong with a new password, in one sentence, or null.
 *
 * @param context - words that anybody would guess: the farm, the person, the e-mail
 */
export function passwordProblem(password: string, context: string[]): string | null {
  const length = [...password].length
  if (length < LEAST_PASSWORD_LENGTH) return `A password needs ${LEAST_PASSWORD_LENGTH} characters or more; a short sentence does well.`
  if (length > MOST_PASSWORD_LENGTH) return `A password can have ${MOST_PASSWORD_LENGTH} characters at most.`
  const plain = password.toLowerCase()
  const bare = plain.replace(/[\d\W_]+$/u, '')
  if (common.has(plain) || common.has(bare) || new Set(plain).size < 5) return 'That password is among the first that anybody tries. Choose another.'
  const word = ['sillion', ...context].map(value => value.toLowerCase()).find(value => value.length >= 4 && plain.replace(/\s/g, '').includes(value.replace(/\s/g, '')))
  if (word) return `A password must not hold '${word}', which is easily guessed.`
  return null
}
