import type { Clock } from '../../config/clock.ts'
import { tooMany } from '../../errors/AppError.ts'

const MINUTE_MS = 60_000
/** Wrong passwords in a row, for one account from one address, that cost nothing: people mistype. */
const FREE_TRIES = 5
const FIRST_DELAY_MS = MINUTE_MS
const LONGEST_DELAY_MS = 15 * MINUTE_MS
/** Wrong passwords for one account from anywhere, after which each costs a pause: short, because the person may be waiting too. */
const FREE_TRIES_FROM_ANYWHERE = 30
const PAUSE_FROM_ANYWHERE_MS = 30_000
/** After so long without a try all is forgotten. */
const FORGET_AFTER_MS = 60 * MINUTE_MS
/** So many accounts and addresses are kept in mind; the oldest go first. */
const REMEMBERED_MAX = 20_000

interface Tries {
  count: number
  lastAt: number
  lockedUntil: number
}

export type SignInGuard = ReturnType<typeof createSignInGuard>

/**
 * Slows down guessing. The delay grows for the account from that one address, so that a stranger elsewhere can't keep the
 * person out; only a guesser who changes addresses brings on a short pause for everybody.
 */
export function createSignInGuard({ clock }: { clock: Clock }) {
  const triesByKey = new Map<string, Tries>()

  function triesOf(key: string): Tries {
    const known = triesByKey.get(key)
    const isForgotten = known === undefined || clock().getTime() - known.lastAt > FORGET_AFTER_MS
    return isForgotten ? { count: 0, lastAt: 0, lockedUntil: 0 } : known
  }

  function count(key: string, delayAfter: (count: number) => number): void {
    const now = clock().getTime()
    const tries = triesOf(key)
    const counted = { count: tries.count + 1, lastAt: now, lockedUntil: now + delayAfter(tries.count + 1) }
    triesByKey.delete(key)
    triesByKey.set(key, counted)
    const [oldest] = triesByKey.keys()
    if (triesByKey.size > REMEMBERED_MAX && oldest !== undefined) triesByKey.delete(oldest)
  }

  return {
    /**
     * Lets a try through and counts it as a wrong one until `succeed` is called, so that many at once are counted too.
     * Throws 429 with the time to wait while the account is locked for this address.
     */
    begin(account: string, address: string): void {
      const lockedUntil = Math.max(triesOf(pairKey(account, address)).lockedUntil, triesOf(account).lockedUntil)
      const waitMs = lockedUntil - clock().getTime()
      if (waitMs > 0) throw tooMany(`Too many wrong passwords. Try again in ${waitWords(waitMs)}.`, waitMs / 1000)
      count(pairKey(account, address), delayForPair)
      count(account, (tries) => (tries >= FREE_TRIES_FROM_ANYWHERE ? PAUSE_FROM_ANYWHERE_MS : 0))
    },

    /** It was the person: what came from this address is forgotten. */
    succeed(account: string, address: string): void {
      triesByKey.delete(pairKey(account, address))
      triesByKey.delete(account)
    },

    /** The person proved themself by mail: nothing is held against the account any more, from wherever it came. */
    forget(account: string): void {
      for (const key of [...triesByKey.keys()]) if (key === account || key.startsWith(`${account} `)) triesByKey.delete(key)
    },
  }
}

function pairKey(account: string, address: string): string {
  return `${account} ${address}`
}

/** 1, 2, 4, 8, then 15 minutes from the fifth wrong password on. */
function delayForPair(tries: number): number {
  if (tries < FREE_TRIES) return 0
  return Math.min(FIRST_DELAY_MS * 2 ** (tries - FREE_TRIES), LONGEST_DELAY_MS)
}

function waitWords(ms: number): string {
  if (ms < MINUTE_MS) return `${Math.ceil(ms / 1000)} seconds`
  const minutes = Math.ceil(ms / MINUTE_MS)
  return minutes === 1 ? 'a minute' : `${minutes} minutes`
}
