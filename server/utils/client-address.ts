import { isIP, isIPv6 } from 'node:net'
import { getHeader, type H3Event } from 'h3'
import { useApp } from '../services/app'

/** Groups of an IPv6 address that name a household's or company's network; the rest it chooses itself. */
const NETWORK_GROUPS = 4

/**
 * Where a request came from: the socket, unless that is a proxy that the settings trust; then the last address in
 * X-Forwarded-For that no trusted proxy wrote. A forged header from anywhere else changes nothing.
 */
export function clientAddress(event: H3Event): string {
  return addressBehindProxies(event.node.req.socket.remoteAddress ?? 'unknown', getHeader(event, 'x-forwarded-for'), useApp().settings.trustedProxies)
}

/**
 * The same, from its parts. Of an IPv6 address only the network is told, since whoever has one address there has all.
 *
 * What a trusted proxy wrote and we can't read is never skipped, else what the caller wrote before it would be believed:
 * the nearest address that we could read stands for the caller then.
 *
 * @returns an IPv4 address, or an IPv6 network as `2001:db8:0:1::/64`
 */
export function addressBehindProxies(socketAddress: string, forwardedFor: string | undefined, trusted: string[]): string {
  const trustedSet = new Set(trusted.map(plain))
  let address = plain(socketAddress)
  for (const written of (forwardedFor ?? '').split(',').map(plain).reverse()) {
    if (!trustedSet.has(address) || isIP(written) === 0) break
    address = written
  }
  return networkOf(address)
}

/** Without port, brackets, interface and IPv6 clothes. */
function plain(address: string): string {
  return address.trim().replace(/^(\d+\.\d+\.\d+\.\d+):\d+$/, '$1').replace(/^\[(.*)\](:\d+)?$/, '$1').replace(/^::ffff:(?=\d+\.)/i, '').replace(/%.*$/, '').toLowerCase()
}

function networkOf(address: string): string {
  if (!isIPv6(address) || address === '::1') return address
  const [head = '', tail] = address.split('::')
  const groups = (part: string) => part === '' ? [] : part.split(':')
  const missing = tail === undefined ? 0 : Math.max(0, 8 - groups(head).length - groups(tail).length)
  const all = [...groups(head), ...Array.from({ length: missing }, () => '0'), ...groups(tail ?? '')]
  return `${all.slice(0, NETWORK_GROUPS).map(group => Number.parseInt(group, 16).toString(16)).join(':')}::/64`
}
