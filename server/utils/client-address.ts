import { getHeader, type H3Event } from 'h3'
import { useApp } from '../services/app'

/**
 * Where a request came from: the socket, unless that is a proxy that the settings trust; then the last address in
 * X-Forwarded-For that no trusted proxy wrote. A forged header from anywhere else changes nothing.
 */
export function clientAddress(event: H3Event): string {
  return addressBehindProxies(event.node.req.socket.remoteAddress ?? 'unknown', getHeader(event, 'x-forwarded-for'), useApp().settings.trustedProxies)
}

/** The same, from its parts. */
export function addressBehindProxies(socketAddress: string, forwardedFor: string | undefined, trusted: string[]): string {
  const plain = (address: string) => address.trim().replace(/^::ffff:/, '')
  const trustedSet = new Set(trusted.map(plain))
  const chain = [...(forwardedFor ?? '').split(',').map(plain).filter(Boolean), plain(socketAddress)]
  while (chain.length > 1 && trustedSet.has(chain.at(-1)!)) chain.pop()
  return chain.at(-1)!
}
