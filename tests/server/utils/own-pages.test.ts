import { describe, expect, it } from 'vitest'
import { isFromOurPages } from '../../../server/utils/own-pages'

const OURS = 'https://farm.example'

describe('isFromOurPages', () => {
  it.each([
    ['a browser that says same-origin', { secFetchSite: 'same-origin', origin: OURS }],
    ['a browser that sends no Origin with it', { secFetchSite: 'same-origin' }],
    ['the server by another of its names', { secFetchSite: 'same-origin', origin: 'http://127.0.0.1:3000', host: '127.0.0.1:3000' }],
    ['an older browser with our Origin', { origin: OURS }],
  ])('takes %s', (_, request) => {
    expect(isFromOurPages(request, OURS)).toBe(true)
  })

  it.each([
    ['another site', { secFetchSite: 'cross-site', origin: OURS }],
    ['a sister site', { secFetchSite: 'same-site', origin: OURS }],
    ['an address typed by hand', { secFetchSite: 'none' }],
    ['nobody who says where they come from', {}],
    ['a foreign Origin', { origin: 'https://elsewhere.example', host: 'farm.example' }],
    ['the Origin of the host alone', { origin: 'http://127.0.0.1:3000', host: '127.0.0.1:3000' }],
    ['a sandboxed page', { secFetchSite: 'same-origin', origin: 'null', host: 'farm.example' }],
    ['an Origin that begins as ours', { origin: `${OURS}.elsewhere.example` }],
  ])('refuses %s', (_, request) => {
    expect(isFromOurPages(request, OURS)).toBe(false)
  })
})
