import type { CookieOptions, Request, Response } from 'express'

const NAME = 'quoinbook_session'
/** Under https the prefix makes browsers insist on Secure, Path=/ and no Domain. */
const SECURE_NAME = `__Host-${NAME}`

/** Set on the app whose address is an https one. */
export const REACHED_BY_HTTPS = 'reached by https'

/** The browser's side is https when the app's address is, also where a proxy in front doesn't say so. */
function isOverHttps(req: Request): boolean {
  return req.secure || req.app.enabled(REACHED_BY_HTTPS)
}

function options(isSecure: boolean): CookieOptions {
  return { httpOnly: true, sameSite: 'lax', secure: isSecure, path: '/' }
}

/** Hands the session id to the browser for as long as the session can last. */
export function setSessionCookie(res: Response, token: string, maxAgeMs: number): void {
  const isSecure = isOverHttps(res.req)
  res.cookie(isSecure ? SECURE_NAME : NAME, token, { ...options(isSecure), maxAge: maxAgeMs })
}

export function clearSessionCookie(res: Response): void {
  const isSecure = isOverHttps(res.req)
  res.clearCookie(isSecure ? SECURE_NAME : NAME, options(isSecure))
}

/** The session id that came with a request. Over https only the prefixed cookie counts: another host of the domain can't plant that one. */
export function readSessionCookie(req: Request): string | null {
  const wanted = isOverHttps(req) ? SECURE_NAME : NAME
  for (const pair of (req.headers.cookie ?? '').split(';')) {
    const [name, value] = pair.split('=', 2)
    if (name?.trim() === wanted && value) return value.trim()
  }
  return null
}
