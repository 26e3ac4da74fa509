import { createServer } from 'node:http'
import type { AddressInfo } from 'node:net'
import { createApp, toNodeListener, type AppOptions, type EventHandler } from 'h3'
import { describeError, type HandledError } from '../../../server/services/describe-error'

/** One handler behind a real socket, with errors in the server's own shape. */
export interface SmallServer { address: string, port: number, close: () => Promise<void> }

export async function smallServer(handler: EventHandler, options: AppOptions = {}): Promise<SmallServer> {
  const app = createApp({
    onError(error, event) {
      const { status, code, message, field } = describeError(error as HandledError)
      event.node.res.writeHead(status, { 'content-type': 'application/json' }).end(JSON.stringify({ error: { code, message, field } }))
    },
    ...options,
  })
  app.use(handler)
  const server = createServer(toNodeListener(app))
  await new Promise<void>(resolve => server.listen(0, '127.0.0.1', resolve))
  const { port } = server.address() as AddressInfo
  return {
    address: `http://127.0.0.1:${port}`,
    port,
    async close() {
      server.closeAllConnections()
      await new Promise(resolve => server.close(resolve))
    },
  }
}
