import { Agent, request, type OutgoingHttpHeaders } from 'node:http'

export interface LoadFigures {
  requestsPerSecond: number
  /** From sending to the whole answer, one of each request. */
  latenciesMs: number[]
}

export interface LoadRequest {
  method: string
  path: string
  headers?: OutgoingHttpHeaders
  body?: string
}

export interface LoadPlan {
  port: number
  connections: number
  /** What a connection sends next; it was told of the answer before. */
  next(connection: number): LoadRequest
  onAnswer?(connection: number, body: Buffer): void
}

/** Keeps some connections of the loopback busy for a while and says how many answers came and how long each took. Throws at the first answer that isn't 200. */
export async function load({ port, connections, next, onAnswer }: LoadPlan, seconds: number): Promise<LoadFigures> {
  const agent = new Agent({ keepAlive: true, maxSockets: connections })
  const latenciesMs: number[] = []
  const startedAt = performance.now()
  const endAt = startedAt + seconds * 1000
  await Promise.all(
    Array.from({ length: connections }, async (_, connection) => {
      while (performance.now() < endAt) {
        const sentAt = performance.now()
        const body = await send(port, agent, next(connection))
        latenciesMs.push(performance.now() - sentAt)
        onAnswer?.(connection, body)
      }
    }),
  )
  const elapsed = (performance.now() - startedAt) / 1000
  agent.destroy()
  return { requestsPerSecond: latenciesMs.length / elapsed, latenciesMs }
}

function send(port: number, agent: Agent, { method, path, headers, body }: LoadRequest): Promise<Buffer> {
  return new Promise((resolve, reject) => {
    const req = request({ host: '127.0.0.1', port, agent, method, path, headers }, (res) => {
      const chunks: Buffer[] = []
      res.on('data', (chunk: Buffer) => chunks.push(chunk))
      res.on('error', reject)
      res.on('end', () => {
        const bytes = Buffer.concat(chunks)
        if (res.statusCode === 200) resolve(bytes)
        else reject(new Error(`${method} ${path} answered ${res.statusCode}: ${bytes.toString().slice(0, 300)}`))
      })
    })
    req.on('error', reject)
    req.end(body)
  })
}
