import { parentPort, workerData } from 'node:worker_threads'
import { compareSync, hashSync } from 'bcryptjs'

export interface HashJob {
  id: number
  password: string
  /** Given: compare with it. Left out: make a new hash. */
  passwordHash?: string
}

export interface HashJobDone {
  id: number
  result: string | boolean
}

const { cost } = workerData as { cost: number }

parentPort?.on('message', ({ id, password, passwordHash }: HashJob) => {
  const result = passwordHash === undefined ? hashSync(password, cost) : compareSync(password, passwordHash)
  parentPort?.postMessage({ id, result } satisfies HashJobDone)
})
