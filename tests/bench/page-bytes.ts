import { brotliCompressSync } from 'node:zlib'
import { launchBrowser, signedIn } from '../e2e/browser'
import { startDemoServer } from '../e2e/demo-server'

/** Bytes of the first view of Today, compressed with brotli, by kind. */
export default async function benchPageBytes(log: (line: string) => void): Promise<void> {
  const demo = await startDemoServer()
  const browser = await launchBrowser()
  try {
    const context = await signedIn(browser, demo, 'owner@brindlemarsh.example')
    const page = await context.newPage()
    const sums: Record<string, { files: number, brotli: number }> = {}
    const pending: Promise<void>[] = []
    page.on('response', (response) => {
      const kind = response.request().resourceType()
      pending.push(response.body().then((body) => {
        const sum = sums[kind] ??= { files: 0, brotli: 0 }
        sum.files++
        // Fonts are compressed already.
        sum.brotli += kind === 'font' ? body.length : brotliCompressSync(body).length
      }).catch(() => undefined))
    })
    await page.goto(`${demo.address}/brindle-marsh/today`, { waitUntil: 'load' })
    await page.waitForTimeout(1500)
    await Promise.all(pending)
    for (const [kind, { files, brotli }] of Object.entries(sums)) log(`today, ${kind}: ${(brotli / 1000).toFixed(1)} kB in ${files} file${files === 1 ? '' : 's'}`)
  }
  finally {
    await browser.close()
    await demo.stop()
  }
}
