import { compare, hash } from 'bcryptjs'
import { PASSWORD_MAX_BYTES } from '../../../shared/schemas/account.ts'

/** Makes and checks password hashes. */
export interface PasswordHasher {
  hash(password: string): Promise<string>
  /** Whether it is the password of the hash. With `null` (no such account) it takes the same time and answers no. */
  matches(password: string, passwordHash: string | null): Promise<boolean>
}

interface HashWork {
  hash(password: string): Promise<string>
  compare(password: string, passwordHash: string): Promise<boolean>
}

/** Well-formed and nobody's: comparing with it takes as long as with a real hash of the same cost. */
function nobodysHash(cost: number): string {
  return `$2b$${String(cost).padStart(2, '0')}$${'nobodyhasthis'.repeat(5).slice(0, 53)}`
}

/** A hasher over something that does the work: this thread here, a worker thread in use (`hashingThread.ts`). */
export function createPasswordHasher(work: HashWork, cost: number): PasswordHasher {
  return {
    hash: (password) => work.hash(password),
    async matches(password, passwordHash) {
      const isSame = await work.compare(password, passwordHash ?? nobodysHash(cost))
      // bcrypt reads 72 bytes and no more: what follows would be ignored, so a longer text is never the password.
      const isWholeRead = Buffer.byteLength(password) <= PASSWORD_MAX_BYTES
      return isSame && isWholeRead && passwordHash !== null
    },
  }
}

/** Hashes on this thread: for commands and tests, which keep nobody waiting. */
export function createPasswordHasherHere(cost: number): PasswordHasher {
  return createPasswordHasher({ hash: (password) => hash(password, cost), compare }, cost)
}
