import { createHash, hkdfSync } from 'node:crypto'
import { errors, jwtVerify, SignJWT } from 'jose'
import type { Clock } from '../../config/clock.ts'
import type { Queryable } from '../../db/client.ts'
import { newId } from '../../db/newId.ts'
import { AppError } from '../../errors/AppError.ts'
import { deleteExpiredTokens, insertSpentToken } from './spentTokenRepository.ts'

const ISSUER = 'quoinbook'
const ALGORITHM = 'HS256'
const HOUR_MS = 3_600_000

/** What a link may be for, and how long it works. */
const LINK_LIFE_MS = { 'password-reset': HOUR_MS, invitation: 7 * 24 * HOUR_MS } as const
export type LinkKind = keyof typeof LINK_LIFE_MS

export interface LinkToken {
  id: string
  userId: string
  /** A mark of the password at the time: the link dies when that changes. */
  passwordMark: string
  expiresAt: string
}

export type LinkTokens = ReturnType<typeof createLinkTokens>

/** Signed tokens for links that leave by mail: one purpose, one person, short-lived, followed once. */
export function createLinkTokens({ secret, clock }: { secret: string; clock: Clock }) {
  // A key for this use alone, so that no other use of the secret can ever make a link.
  const key = new Uint8Array(hkdfSync('sha256', secret, '', 'quoinbook link tokens', 32))

  return {
    async issue(kind: LinkKind, userId: string, passwordHash: string | null): Promise<string> {
      const now = clock()
      return new SignJWT({ pw: markOf(passwordHash) })
        .setProtectedHeader({ alg: ALGORITHM })
        .setIssuer(ISSUER)
        .setAudience(kind)
        .setSubject(userId)
        .setJti(newId())
        .setIssuedAt(now)
        .setExpirationTime(new Date(now.getTime() + LINK_LIFE_MS[kind]))
        .sign(key)
    },

    /** The token of a link, checked. Throws 422 `link-ended` when it isn't ours, isn't for this, or is too old. */
    async read(kind: LinkKind, token: string): Promise<LinkToken> {
      try {
        const { payload } = await jwtVerify(token, key, {
          algorithms: [ALGORITHM],
          issuer: ISSUER,
          audience: kind,
          currentDate: clock(),
          requiredClaims: ['sub', 'jti', 'exp'],
        })
        const expiresAt = new Date(Number(payload.exp) * 1000).toISOString()
        return { id: String(payload.jti), userId: String(payload.sub), passwordMark: String(payload.pw), expiresAt }
      } catch (error) {
        if (error instanceof errors.JOSEError) throw linkEnded()
        throw error
      }
    },

    /** Uses the token up, in the write that it allows. Throws 422 when it was used before or the password has changed since. */
    spend(tx: Queryable, token: LinkToken, passwordHash: string | null): void {
      const now = clock().toISOString()
      deleteExpiredTokens(tx, now)
      const isFirstUse = insertSpentToken(tx, { idHash: hashOf(token.id), spentAt: now, expiresAt: token.expiresAt })
      if (!isFirstUse || token.passwordMark !== markOf(passwordHash)) throw linkEnded()
    },
  }
}

/** The one answer to every link that doesn't work, so that it tells nothing about the account. */
export function linkEnded(): AppError {
  const detail = 'This link was used already or is too old. Ask for a new one.'
  return new AppError({
    status: 422,
    code: 'link-ended',
    detail,
    errors: [{ path: 'token', code: 'link-ended', message: 'was used already or is too old' }],
  })
}

function markOf(passwordHash: string | null): string {
  return passwordHash === null ? '' : hashOf(passwordHash).slice(0, 16)
}

function hashOf(text: string): string {
  return createHash('sha256').update(text).digest('hex')
}
