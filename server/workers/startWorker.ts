import { Worker } from 'node:worker_threads'

const TSX = import.meta.resolve('tsx/esm/api')

/**
 * Starts a worker thread from a TypeScript file. A thread of Node.js 20 doesn't take over the loader that the process
 * was started with, so this one registers it before it imports the file.
 */
export function startWorker(file: URL, workerData: unknown): Worker {
  const bootstrap = `import(${JSON.stringify(TSX)}).then(({ register }) => { register(); return import(${JSON.stringify(file.href)}) })`
  return new Worker(bootstrap, { eval: true, workerData })
}
