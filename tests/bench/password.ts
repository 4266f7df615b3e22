import { PASSWORD_COST } from '../../server/features/accounts/passwordCost.ts'
import { startHashingThread } from '../../server/workers/hashingThread.ts'
import { benchFigure, type BenchFigure } from './figure.ts'
import { median } from './median.ts'

const ROUNDS = 7

/** What a password costs, for information: it is meant to be slow, and is made on a thread of its own. */
export async function* passwordBench(): AsyncGenerator<BenchFigure> {
  const hasher = startHashingThread(PASSWORD_COST)
  // The thread alone keeps no process alive.
  const awake = setInterval(() => {}, 1000)
  try {
    await hasher.hash('the thread starts with this one')
    const times: number[] = []
    for (let round = 0; round < ROUNDS; round += 1) {
      const startedAt = performance.now()
      await hasher.hash('an invented password of thirty')
      times.push(performance.now() - startedAt)
    }
    yield benchFigure({ name: `password: one hash of cost ${PASSWORD_COST}`, value: median(times), unit: 'ms' })
  } finally {
    clearInterval(awake)
    await hasher.stop()
  }
}
