import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core'
import type { DemoServer } from './demo-server'

/** Debian's Chromium, with nothing that reaches out of the machine. */
export function launchBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: process.env.CHROMIUM || '/usr/bin/chromium',
    args: ['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking', '--disable-component-update', '--disable-sync'],
  })
}

export const DESKTOP = { width: 1440, height: 1000 }
export const PHONE = { width: 390, height: 844 }

/** Every console error, hydration warning, page error and blocked resource of a page, as it comes. */
export function complaintsOf(page: Page): string[] {
  const complaints: string[] = []
  page.on('console', (message) => {
    if (['error', 'warning'].includes(message.type())) complaints.push(`${message.type()}: ${message.text()}`)
  })
  page.on('pageerror', error => complaints.push(`page error: ${error.message}`))
  return complaints
}

/** A context that is signed in through the form's own route. */
export async function signedIn(browser: Browser, server: DemoServer, email: string, options: Parameters<Browser['newContext']>[0] = {}): Promise<BrowserContext> {
  const context = await browser.newContext({ viewport: DESKTOP, ...options })
  const answer = await context.request.post(`${server.address}/api/auth/sign-in`, {
    data: { email, password: server.password },
    headers: { origin: server.address },
  })
  if (!answer.ok()) throw new Error(`${email} could not sign in: ${answer.status()} ${await answer.text()}`)
  return context
}
