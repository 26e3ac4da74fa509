import { describe, expect, it } from 'vitest'
import { addressBehindProxies } from '../../../server/utils/client-address'

describe('addressBehindProxies', () => {
  it.each([
    ['the socket, without proxies', '10.0.0.5', undefined, [], '10.0.0.5'],
    ['the socket, whatever a stranger’s header says', '10.0.0.5', '1.2.3.4', [], '10.0.0.5'],
    ['the socket, whatever a header says that a stranger sent past the proxy', '10.0.0.5', '1.2.3.4', ['10.0.0.1'], '10.0.0.5'],
    ['what the trusted proxy wrote last', '10.0.0.1', '6.6.6.6, 1.2.3.4', ['10.0.0.1'], '1.2.3.4'],
    ['what came before a chain of trusted proxies', '10.0.0.1', '6.6.6.6, 1.2.3.4, 10.0.0.2', ['10.0.0.1', '10.0.0.2'], '1.2.3.4'],
    ['the proxy, when it wrote nothing', '10.0.0.1', undefined, ['10.0.0.1'], '10.0.0.1'],
    ['the proxy, when only nonsense stands there', '10.0.0.1', 'unknown, <script>', ['10.0.0.1'], '10.0.0.1'],
    ['what the proxy wrote with a port', '10.0.0.1', '9.9.9.9, 1.2.3.4:5678', ['10.0.0.1'], '1.2.3.4'],
    ['what the proxy wrote in brackets with a port', '10.0.0.1', '9.9.9.9, [2001:db8::1]:443', ['10.0.0.1'], '2001:db8:0:0::/64'],
    ['the proxy, when it wrote that it does not know, never what the caller wrote before', '10.0.0.1', '9.9.9.9, unknown', ['10.0.0.1'], '10.0.0.1'],
    ['an IPv4 address in IPv6 clothes', '::ffff:10.0.0.5', undefined, [], '10.0.0.5'],
    ['a trusted proxy in IPv6 clothes', '::ffff:10.0.0.1', '1.2.3.4', ['10.0.0.1'], '1.2.3.4'],
    ['the network of an IPv6 address', '2001:db8:0:1:aaaa::1', undefined, [], '2001:db8:0:1::/64'],
    ['the same network for its neighbour', '2001:db8:0:1:bbbb:cccc:dddd:eeee', undefined, [], '2001:db8:0:1::/64'],
    ['a network with its zeros left out', '2001:db8::5', undefined, [], '2001:db8:0:0::/64'],
    ['a local one with its interface', 'fe80::1%eth0', undefined, [], 'fe80:0:0:0::/64'],
    ['this machine', '::1', undefined, [], '::1'],
  ])('tells %s', (_, socket, header, trusted, address) => {
    expect(addressBehindProxies(socket, header, trusted)).toBe(address)
  })
})
