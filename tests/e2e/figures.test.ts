import AxeBuilder from '@axe-core/playwright'
import type { Browser } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { complaintsOf, DESKTOP, launchBrowser, PHONE, signedIn } from './browser'
import { startDemoServer, type DemoServer } from './demo-server'

describe('the Figures page, in a browser', () => {
  let server: DemoServer
  let browser: Browser
  beforeAll(async () => void ([server, browser] = await Promise.all([startDemoServer(), launchBrowser()])))
  afterAll(async () => {
    await browser?.close()
    await server?.stop()
  })
  const figures = () => `${server.address}/brindle-marsh/figures`

  it.each([['desktop', DESKTOP, 'light'], ['phone', PHONE, 'night']] as const)('is drawn without complaint on the %s', async (_, viewport, theme) => {
    const context = await signedIn(browser, server, 'agronomist@brindlemarsh.example', { viewport })
    await context.addCookies([{ name: 'theme', value: theme, url: server.address }])
    const page = await context.newPage()
    const complaints = complaintsOf(page)
    await page.goto(figures(), { waitUntil: 'load' })
    await page.waitForTimeout(500)
    expect(await page.getByRole('heading', { level: 1 }).textContent()).toMatch(/^\s*All \d+ published values hold\s*$/)
    expect(complaints).toEqual([])
    expect(await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)).toBeLessThanOrEqual(0)
    const { violations } = await new AxeBuilder({ page }).withTags(['wcag2a', 'wcag2aa', 'wcag21aa', 'wcag22aa', 'best-practice']).withRules(['color-contrast-enhanced']).analyze()
    expect(violations.map(violation => `${violation.id}: ${violation.nodes.slice(0, 3).map(node => node.html.slice(0, 160)).join(' | ')}`)).toEqual([])
    await context.close()
  })

  it('opens at the entry of a number that was asked about on Today', async () => {
    const context = await signedIn(browser, server, 'owner@brindlemarsh.example')
    const page = await context.newPage()
    await page.goto(`${server.address}/brindle-marsh/today`, { waitUntil: 'load' })
    await page.waitForTimeout(500)
    await page.getByRole('button', { name: /Done before rain/ }).first().click()
    await page.getByRole('link', { name: /How this is worked out/ }).click()
    await page.waitForURL(`${figures()}#rain-line`)
    const entry = page.locator('#rain-line')
    await entry.getByRole('table').waitFor()
    expect(await entry.getByRole('row').count()).toBe(15)
    expect(await entry.textContent()).toContain('Does not know')
    await context.close()
  })

  it('doesn’t scroll sideways at 320 px, and is nothing to whoever is not of the farm', async () => {
    const context = await signedIn(browser, server, 'owner@secondfarm.example', { viewport: { width: 320, height: 700 } })
    const page = await context.newPage()
    await page.goto(`${server.address}/cairn-flats/figures`, { waitUntil: 'load' })
    expect(await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)).toBeLessThanOrEqual(0)
    const foreign = await page.goto(figures(), { waitUntil: 'load' })
    expect(foreign?.status()).toBe(404)
    expect(await page.getByRole('heading', { level: 1 }).textContent()).toContain('nothing here')
    await context.close()
  })
})
