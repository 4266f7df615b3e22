import type { Server } from 'node:http'
import type { Express } from 'express'
import { StartRefusal } from '../config/StartRefusal.ts'

/** Listens, or says in words why it can't. */
export function listen(app: Express, { host, port }: { host: string; port: number }): Promise<Server> {
  return new Promise((resolve, reject) => {
    const server = app.listen(port, host, (error?: Error) => (error ? reject(asRefusal(error, host, port)) : resolve(server)))
  })
}

function asRefusal(error: Error, host: string, port: number): Error {
  const code = 'code' in error ? error.code : undefined
  if (code === 'EADDRINUSE') {
    return new StartRefusal(
      `Port ${port} is in use, perhaps by another Quoinbook. Stop that one or choose another port: PORT=${port + 1} npm start`,
    )
  }
  if (code === 'EACCES') return new StartRefusal(`This user may not listen on port ${port}. Choose one above 1023: PORT=4400 npm start`)
  if (code === 'EADDRNOTAVAIL' || code === 'ENOTFOUND')
    return new StartRefusal(`${host} is not an address of this machine. HOST says where to listen.`)
  return error
}
