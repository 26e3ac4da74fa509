import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import autocannon from 'autocannon'
import { startDemoServer, type DemoServer } from '../e2e/demo-server'

const ROUNDS = 3
const SECONDS = 5

/** Requests per second for the Ground order, signed in, against bare node:http that sends the same bytes. */
export default async function benchGroundOrder(log: (line: string) => void): Promise<void> {
  const demo = await startDemoServer()
  try {
    const cookie = await signIn(demo)
    const url = `${demo.address}/api/farms/brindle-marsh/ground-order`
    const cold = performance.now()
    const body = Buffer.from(await (await fetch(url, { headers: { cookie } })).arrayBuffer())
    const first = performance.now() - cold
    const control = await startControl(body)
    const ours: number[] = []
    const bare: number[] = []
    for (let round = 0; round <= ROUNDS; round++) {
      const controlRate = await rate(`http://localhost:${(control.address() as AddressInfo).port}`, {})
      const ownRate = await rate(url, { cookie })
      if (round === 0) continue // the first round only warms both up
      ours.push(ownRate)
      bare.push(controlRate)
    }
    control.close()
    log(`ground order: ${Math.max(...ours).toFixed(0)} requests/s, bare Node ${Math.max(...bare).toFixed(0)} requests/s, ratio ${(Math.max(...ours) / Math.max(...bare)).toFixed(3)} (${(body.length / 1000).toFixed(0)} kB of JSON, first answer ${first.toFixed(0)} ms)`)
  }
  finally {
    await demo.stop()
  }
}

async function signIn(demo: DemoServer): Promise<string> {
  const answer = await fetch(`${demo.address}/api/auth/sign-in`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', 'origin': demo.address },
    body: JSON.stringify({ email: 'owner@brindlemarsh.example', password: demo.password }),
  })
  if (!answer.ok) throw new Error(`sign-in answered ${answer.status}`)
  return answer.headers.getSetCookie().map(cookie => cookie.split(';')[0]).join('; ')
}

function startControl(body: Buffer): Promise<Server> {
  return new Promise((resolve) => {
    const server = createServer((_, answer) => {
      answer.setHeader('content-type', 'application/json')
      answer.end(body)
    })
    server.listen(0, () => resolve(server))
  })
}

async function rate(url: string, headers: Record<string, string>): Promise<number> {
  const result = await autocannon({ url, headers, connections: 20, duration: SECONDS })
  if (result.non2xx > 0 || result.errors > 0) throw new Error(`${url}: ${result.non2xx} refusals, ${result.errors} errors`)
  return result.requests.average
}
