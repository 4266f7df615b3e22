import { afterAll, describe, expect, it } from 'vitest'
import { createPasswordHasherHere } from '../../server/features/accounts/passwordHasher.ts'
import { startHashingThread } from '../../server/workers/hashingThread.ts'

const thread = startHashingThread(5)
afterAll(() => thread.stop())

describe.each([
  ['on a thread of its own', thread],
  ['on this thread', createPasswordHasherHere(5)],
])('hashing passwords %s', (_where, hasher) => {
  it('knows the password again, and no other', async () => {
    const hash = await hasher.hash('seven quiet gutters')
    expect(hash).toMatch(/^\$2[aby]\$05\$/)
    expect(await hasher.matches('seven quiet gutters', hash)).toBe(true)
    expect(await hasher.matches('seven quiet gutter', hash)).toBe(false)
  })

  it('makes another hash of the same password each time', async () => {
    expect(await hasher.hash('seven quiet gutters')).not.toBe(await hasher.hash('seven quiet gutters'))
  })

  it('answers no where there is no account, and takes as long about it', async () => {
    const hash = await hasher.hash('seven quiet gutters')
    const shortest = { somebody: Infinity, nobody: Infinity }
    for (let time = 0; time < 40; time += 1) {
      for (const [who, passwordHash] of [
        ['somebody', hash],
        ['nobody', null],
      ] as const) {
        const begun = performance.now()
        expect(await hasher.matches('some other words', passwordHash)).toBe(false)
        shortest[who] = Math.min(shortest[who], performance.now() - begun)
      }
    }
    const ratio = shortest.nobody / shortest.somebody
    expect(ratio).toBeGreaterThan(0.5)
    expect(ratio).toBeLessThan(2)
  })

  it('keeps answers apart when many ask at once', async () => {
    const words = Array.from({ length: 12 }, (_, number) => `password number ${number}`)
    const hashes = await Promise.all(words.map((word) => hasher.hash(word)))
    const answers = await Promise.all(words.map((word, number) => hasher.matches(word, hashes[number] ?? null)))
    expect(answers).toEqual(words.map(() => true))
  })
})

describe('the hashing thread', () => {
  it('leaves this one free meanwhile', async () => {
    const slow = startHashingThread(11)
    const hashed = slow.hash('seven quiet gutters')
    let ticks = 0
    const timer = setInterval(() => (ticks += 1), 5)
    await hashed
    clearInterval(timer)
    await slow.stop()
    expect(ticks).toBeGreaterThan(5)
  })

  it('asks people to try again rather than letting them wait without end', async () => {
    const answers = await Promise.allSettled(Array.from({ length: 60 }, () => thread.hash('seven quiet gutters')))
    const refused = answers.filter(({ status }) => status === 'rejected')
    expect(refused).toHaveLength(20)
    expect(refused[0]).toMatchObject({ reason: { status: 503, headers: { 'Retry-After': '10' } } })
  })

  it('fails what it was asked when it ends, instead of leaving it open, and starts anew for the next', async () => {
    const ending = startHashingThread(11)
    const hashed = ending.hash('seven quiet gutters')
    const failed = expect(hashed).rejects.toThrow('ended')
    await ending.stop()
    await failed
    expect(await ending.hash('seven quiet gutters')).toMatch(/^\$2/)
    await ending.stop()
  })
})
