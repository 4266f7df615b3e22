import type { AddressInfo } from 'node:net'
import type { Express } from 'express'

/** Lets a test app listen on a port of its own, for what needs a real connection: streams and large bodies. */
export async function listenTo({ app }: { app: Express }): Promise<{ url: string; close: () => Promise<void> }> {
  const server = app.listen(0, '127.0.0.1')
  await new Promise((resolve) => server.once('listening', resolve))
  const { port } = server.address() as AddressInfo
  return {
    url: `http://127.0.0.1:${port}`,
    close: () =>
      new Promise((resolve) => {
        server.close(() => resolve())
        server.closeAllConnections()
      }),
  }
}
