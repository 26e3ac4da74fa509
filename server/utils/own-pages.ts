/**
 * True when a change comes from our own pages, as the browser tells it.
 *
 * `Sec-Fetch-Site: same-origin` can't be forged by another site's page; the Origin beside it must then be ours or that
 * of the host that was asked. Without a word on the site, the Origin must be ours.
 *
 * @param publicOrigin - the address that people use, without a path
 */
export function isFromOurPages({ secFetchSite, origin, host }: { secFetchSite?: string, origin?: string, host?: string }, publicOrigin: string): boolean {
  if (secFetchSite === undefined) return origin === publicOrigin
  if (secFetchSite !== 'same-origin') return false
  return origin === undefined || origin === publicOrigin || (host !== undefined && [`https://${host}`, `http://${host}`].includes(origin))
}
