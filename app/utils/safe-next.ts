/** Where to go after signing in: one of our own pages by its pattern, never an address that somebody handed over. */
export function safeNext(next: unknown): string {
  return typeof next === 'string' && /^\/[a-z0-9-]+\/(today|figures)$/.test(next) ? next : '/'
}
