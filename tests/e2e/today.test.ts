import { mkdirSync } from 'node:fs'
import AxeBuilder from '@axe-core/playwright'
import type { Browser, BrowserContext, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { complaintsOf, DESKTOP, launchBrowser, PHONE, signedIn } from './browser'
import { startDemoServer, type DemoServer } from './demo-server'

const OWNER = 'owner@brindlemarsh.example'

describe('Today, in a browser', () => {
  let server: DemoServer
  let browser: Browser
  beforeAll(async () => {
    [server, browser] = await Promise.all([startDemoServer(), launchBrowser()])
    mkdirSync('tests/e2e/screenshots', { recursive: true })
  })
  afterAll(async () => {
    await browser?.close()
    await server?.stop()
  })
  const today = () => `${server.address}/brindle-marsh/today`

  async function open(context: BrowserContext, theme: 'light' | 'night', address = today()): Promise<{ page: Page, complaints: string[] }> {
    await context.addCookies([{ name: 'theme', value: theme, url: server.address }])
    const page = await context.newPage()
    const complaints = complaintsOf(page)
    await page.goto(address, { waitUntil: 'load' })
    await page.waitForTimeout(500)
    return { page, complaints }
  }

  it('takes a person from the sign-in page to the order', async () => {
    const context = await browser.newContext({ viewport: DESKTOP })
    const { page, complaints } = await open(context, 'light')
    expect(page.url()).toContain('/sign-in?next=')
    await page.getByLabel('Email').fill(OWNER)
    await page.getByLabel('Password').fill('not the password')
    await page.getByRole('button', { name: 'Sign in' }).click()
    await page.getByRole('alert').waitFor()
    expect(await page.getByRole('alert').textContent()).toContain('don\'t go together')
    expect(await page.getByLabel('Email').inputValue()).toBe(OWNER)
    await page.getByLabel('Password').fill(server.password)
    await page.getByRole('button', { name: 'Sign in' }).click()
    await page.waitForURL(today())
    expect(await page.getByRole('heading', { level: 1 }).textContent()).toMatch(/^(Thursday|Friday) /)
    expect(complaints.filter(complaint => !complaint.includes('401'))).toEqual([])
    await context.close()
  })

  it.each([
    ['desktop', DESKTOP, 'light'], ['desktop', DESKTOP, 'night'], ['phone', PHONE, 'light'], ['phone', PHONE, 'night'],
  ] as const)('is drawn without complaint on the %s, %o, %s', async (name, viewport, theme) => {
    const context = await signedIn(browser, server, OWNER, { viewport })
    const { page, complaints } = await open(context, theme)
    await page.screenshot({ path: `tests/e2e/screenshots/today-${name}-${theme}.png` })
    if (process.env.README_PICTURE && name === 'desktop' && theme === 'light') await page.screenshot({ path: 'tests/e2e/pictures/today.png' })
    expect(complaints).toEqual([])
    expect(await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)).toBeLessThanOrEqual(0)
    const { violations } = await new AxeBuilder({ page }).withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice']).withRules(['color-contrast-enhanced']).analyze()
    expect(violations.map(violation => `${violation.id}: ${violation.nodes.slice(0, 3).map(node => node.html.slice(0, 160)).join(' | ')}`)).toEqual([])
    await context.close()
  })

  it('doesn’t scroll sideways at 320 px', async () => {
    const context = await signedIn(browser, server, OWNER, { viewport: { width: 320, height: 700 } })
    for (const address of [today(), `${today()}?view=table`, `${server.address}/sign-in`]) {
      const { page } = await open(context, 'light', address)
      expect(await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)).toBeLessThanOrEqual(0)
    }
    await context.close()
  })

  it('opens a number to its inputs, sources and age, by keyboard too', async () => {
    const context = await signedIn(browser, server, OWNER)
    const { page } = await open(context, 'light')
    const number = page.getByRole('button', { name: /^At stake by waiting/ }).first()
    await number.focus()
    await page.keyboard.press('Enter')
    const dialog = page.getByRole('dialog')
    await dialog.waitFor()
    expect(await dialog.locator('dl > div').count()).toBeGreaterThan(2)
    expect(await dialog.locator('.sources li').count()).toBeGreaterThan(1)
    await page.keyboard.press('Escape')
    await dialog.waitFor({ state: 'hidden' })
    await context.close()
  })

  it('shows the same rows as a table', async () => {
    const context = await signedIn(browser, server, OWNER)
    const { page } = await open(context, 'light')
    const rows = await page.locator('ol > li.row').count()
    expect(rows).toBeGreaterThan(7)
    await page.getByRole('link', { name: 'Show as table' }).click()
    await page.getByRole('table').waitFor()
    expect(await page.locator('tbody tr').count()).toBe(rows)
    expect(new URL(page.url()).search).toBe('?view=table')
    await context.close()
  })

  it('gives the demo’s clock to the owner only, and says no on a farm that isn’t one’s own', async () => {
    const crew = await signedIn(browser, server, 'crew@brindlemarsh.example')
    const { page } = await open(crew, 'light')
    expect(await page.getByRole('group', { name: 'Demo clock' }).count()).toBe(0)
    await page.goto(`${server.address}/cairn-flats/today`)
    expect(await page.getByRole('heading', { level: 1 }).textContent()).toBe('There is nothing here')
    await crew.close()
  })

  it('lets the agronomist choose between two farms', async () => {
    const context = await signedIn(browser, server, 'agronomist@brindlemarsh.example')
    const { page } = await open(context, 'light', server.address)
    await page.getByRole('link', { name: /Cairn Flats/ }).click()
    await page.locator('li.row').first().waitFor()
    expect(page.url()).toBe(`${server.address}/cairn-flats/today`)
    expect(await page.locator('ol > li.row').count()).toBe(6)
    await context.close()
  })

  it('updates an open page by itself when the clock moves on elsewhere', async () => {
    const [one, two] = [await signedIn(browser, server, OWNER), await signedIn(browser, server, 'operator@brindlemarsh.example')]
    const [{ page: mover }, { page: watcher }] = [await open(one, 'light'), await open(two, 'light')]
    const before = await watcher.locator('.mast-end .wide').last().textContent()
    await mover.getByRole('button', { name: '6 hours' }).click()
    await watcher.waitForFunction(text => document.querySelector('.mast-end .wide:last-of-type')?.textContent !== text, before, { timeout: 20_000 })
    await Promise.all([one.close(), two.close()])
  })

  it('says how old the forecast is when the service is away', async () => {
    server.trouble('500')
    const context = await signedIn(browser, server, OWNER)
    const { page } = await open(context, 'light')
    await page.getByRole('button', { name: '6 hours' }).click()
    await page.getByText(/The forecast is late/).first().waitFor({ timeout: 30_000 })
    await page.screenshot({ path: 'tests/e2e/screenshots/today-late.png' })
    for (let move = 0; move < 4; move++) {
      await page.getByRole('button', { name: '6 hours' }).click()
      await page.waitForFunction(() => !document.querySelector('.clock-moves [role=status]')?.textContent)
      await page.waitForTimeout(300)
    }
    await page.getByText(/too old, so no advice/).first().waitFor({ timeout: 30_000 })
    expect(await page.locator('.row-number.chance b').allTextContents()).toEqual(expect.not.arrayContaining([expect.stringMatching(/\d/)]))
    await page.screenshot({ path: 'tests/e2e/screenshots/today-expired.png' })
    server.trouble(null)
    await context.close()
  })
})
