import { createError } from 'h3'

const PHRASES: Record<number, string> = {
  400: 'Bad Request', 401: 'Unauthorized', 403: 'Forbidden', 404: 'Not Found', 405: 'Method Not Allowed', 408: 'Request Timeout', 409: 'Conflict', 412: 'Precondition Failed',
  413: 'Content Too Large', 415: 'Unsupported Media Type', 422: 'Unprocessable Content', 429: 'Too Many Requests', 500: 'Internal Server Error', 502: 'Bad Gateway', 503: 'Service Unavailable', 507: 'Insufficient Storage',
}

/**
 * Ends the request with a status, a code for programs and a sentence for people.
 *
 * @param field - the input that the sentence is about
 */
export function fail(status: number, code: string, message: string, field?: string): never {
  throw createError({ statusCode: status, statusMessage: PHRASES[status] ?? 'Error', message, data: { code, field } })
}
