import type { RequestHandler } from 'express'
import helmet from 'helmet'

/**
 * What the browser may do with our pages: nothing from elsewhere, no framing, no inline script.
 * Inline styles are let in because the component library and the grid write theirs into the page.
 */
export function securityHeaders({ isHttps }: { isHttps: boolean }): RequestHandler {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        'default-src': ["'self'"],
        'base-uri': ["'self'"],
        'form-action': ["'self'"],
        'object-src': ["'none'"],
        'script-src-attr': ["'none'"],
        'style-src': ["'self'", "'unsafe-inline'"],
        'img-src': ["'self'", 'blob:', 'data:'],
        'font-src': ["'self'", 'data:'],
        'worker-src': ["'self'", 'blob:'],
        'frame-ancestors': ["'none'"],
      },
    },
    // On plain http (a machine on its own desk) a promise of https would lock people out.
    strictTransportSecurity: isHttps,
    referrerPolicy: { policy: 'same-origin' },
    xFrameOptions: { action: 'deny' },
  })
}
