import type { RequestHandler } from 'express'
import { forbidden } from '../errors/AppError.ts'

const READING_METHODS = new Set(['GET', 'HEAD', 'OPTIONS'])

/**
 * Refuses writes that another site made a browser send. Browsers put `Sec-Fetch-Site` or `Origin` on every write;
 * a program that sends neither holds its cookie by itself and is not being led by a page.
 */
export function sameOrigin(appUrl: string): RequestHandler {
  const appOrigin = new URL(appUrl).origin
  return (req, _res, next) => {
    if (READING_METHODS.has(req.method)) return next()
    const site = req.get('sec-fetch-site')
    const origin = req.get('origin')
    const cameFromElsewhere = site !== undefined && site !== 'same-origin' && site !== 'none'
    const ownOrigins = [appOrigin, `${req.protocol}://${req.get('host') ?? ''}`]
    const isForeignOrigin = origin !== undefined && !ownOrigins.includes(origin)
    // The development server proxies from its own port: the browser vouches for it as same-origin.
    const isVouchedFor = site === 'same-origin'
    if (cameFromElsewhere || (isForeignOrigin && !isVouchedFor))
      return next(forbidden('This was sent from another site. Open Quoinbook itself and try again.'))
    next()
  }
}
