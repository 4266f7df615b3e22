import type { Server } from 'node:http'

/** How long requests in hand may take to end before they are cut off. */
const PATIENCE_MS = 10_000

/** Takes no new requests, ends the open streams, and waits for what is being answered. */
export function stopGracefully(server: Server, endStreams: () => void): Promise<void> {
  return new Promise((resolve) => {
    server.close(() => resolve())
    endStreams()
    server.closeIdleConnections()
    setTimeout(() => server.closeAllConnections(), PATIENCE_MS).unref()
  })
}
