import { readFile } from 'node:fs/promises'
import { join } from 'node:path'
import { promisify } from 'node:util'
import { brotliCompress, constants, gzip } from 'node:zlib'
import type { RequestHandler } from 'express'
import { FOREVER } from './cacheHeaders.ts'

const COMPRESS = {
  // Quality 5 is about as quick as gzip and a sixth smaller; more would keep the first reader waiting.
  br: (content: Buffer) => promisify(brotliCompress)(content, { params: { [constants.BROTLI_PARAM_QUALITY]: 5 } }),
  gzip: (content: Buffer) => promisify(gzip)(content),
} as const
type Encoding = keyof typeof COMPRESS

/** A hashed file of the build, in one folder: `EstimateView-Cx7.js`. */
const ASSET_PATH = /^\/([\w-]+(?:\.[\w-]+)*\.(js|css|svg))$/

/** Sends the build's scripts and styles compressed, each compressed once and then kept: their names change with their content. */
export function compressedAssets(folder: string): RequestHandler {
  const compressed = new Map<string, Promise<Buffer>>()

  function compressOnce(name: string, encoding: Encoding): Promise<Buffer> {
    const key = `${encoding} ${name}`
    const known = compressed.get(key)
    if (known) return known
    const made = readFile(join(folder, name)).then(COMPRESS[encoding])
    compressed.set(key, made)
    made.catch(() => compressed.delete(key))
    return made
  }

  return async (req, res, next) => {
    const [, name, extension] = ASSET_PATH.exec(req.path) ?? []
    const encoding = req.acceptsEncodings('br', 'gzip')
    const isMeant = (req.method === 'GET' || req.method === 'HEAD') && name && extension && (encoding === 'br' || encoding === 'gzip')
    if (!isMeant) return next()
    const content = await compressOnce(name, encoding).catch(() => null)
    if (!content) return next()
    res.setHeader('Content-Encoding', encoding)
    res.setHeader('Cache-Control', FOREVER)
    res.vary('Accept-Encoding').type(extension).send(content)
  }
}
