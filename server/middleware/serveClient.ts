import { existsSync } from 'node:fs'
import { join } from 'node:path'
import express, { Router } from 'express'
import { AppError, notFound } from '../errors/AppError.ts'
import { ASK_EACH_TIME, FOREVER } from './cacheHeaders.ts'
import { compressedAssets } from './compressedAssets.ts'

/** Serves the built client: its files, and the one page for every address that the client routes itself. */
export function serveClient(folder: string): Router {
  const router = Router()
  const page = join(folder, 'index.html')
  router.use('/assets', compressedAssets(join(folder, 'assets')))
  router.use(
    '/assets',
    express.static(join(folder, 'assets'), {
      index: false,
      immutable: true,
      maxAge: '1y',
      setHeaders: (res) => res.setHeader('Cache-Control', FOREVER),
    }),
  )
  router.use(express.static(folder, { index: false, setHeaders: (res) => res.setHeader('Cache-Control', ASK_EACH_TIME) }))
  router.get('/*splat', sendPage)
  router.get('/', sendPage)
  router.use(() => {
    throw notFound('address')
  })
  return router

  function sendPage(req: express.Request, res: express.Response, next: express.NextFunction): void {
    const isFile = /\.\w+$/.test(req.path)
    if (isFile) return next(notFound('file'))
    if (!existsSync(page)) return next(notBuilt())
    res.setHeader('Cache-Control', ASK_EACH_TIME)
    res.sendFile(page)
  }
}

function notBuilt(): AppError {
  return new AppError({
    status: 503,
    code: 'client-not-built',
    detail:
      'The pages are not built yet. Run "npm run build" (npm start does it by itself), or "npm run dev" and open the address that it prints.',
  })
}
