import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { buildTestApp, type TestApp } from '../support/buildTestApp.ts'

const SCRIPT = `export const words = '${'quoin '.repeat(2000)}'`

let folder: string
let app: TestApp

beforeEach(() => {
  folder = join(mkdtempSync(join(tmpdir(), 'quoinbook-client-')), 'dist')
  mkdirSync(folder)
  mkdirSync(join(folder, 'assets'))
  writeFileSync(join(folder, 'index.html'), '<!doctype html><title>Quoinbook</title>')
  writeFileSync(join(folder, 'assets', 'index-Cx7Yz.js'), SCRIPT)
  writeFileSync(join(folder, 'assets', 'inter-Ab1.woff2'), 'font')
  writeFileSync(join(folder, 'robots.txt'), 'User-agent: *')
  app = buildTestApp({ clientFolder: folder })
})
afterEach(() => rmSync(join(folder, '..'), { recursive: true }))

function get(path: string, encoding = 'identity') {
  return app.anonymous().get(path).set('Accept-Encoding', encoding)
}

describe('the built client', () => {
  it('is one page for every address that it routes itself, asked for anew each time', async () => {
    for (const path of ['/', '/houses', '/houses/abc/rooms', '/accept-invitation?token=a.b.c']) {
      const answer = await get(path)
      expect([path, answer.status, answer.headers['cache-control']]).toEqual([path, 200, 'no-cache'])
      expect(answer.text).toContain('<title>Quoinbook</title>')
      expect(answer.headers['content-security-policy']).toContain("frame-ancestors 'none'")
    }
  })

  it('has files that are named after their content and kept for a year', async () => {
    const script = await get('/assets/index-Cx7Yz.js')
    expect([script.status, script.headers['cache-control']]).toEqual([200, 'public, max-age=31536000, immutable'])
    expect(script.headers['content-type']).toContain('text/javascript')
    expect((await get('/assets/inter-Ab1.woff2')).headers['cache-control']).toBe('public, max-age=31536000, immutable')
  })

  it.each(['br', 'gzip'])('sends scripts compressed by %s, which unpack to the same', async (encoding) => {
    for (const round of ['first', 'kept']) {
      const answer = await get('/assets/index-Cx7Yz.js', encoding)
      expect([round, answer.headers['content-encoding'], answer.headers.vary]).toEqual([round, encoding, 'Accept-Encoding'])
      expect(Number(answer.headers['content-length'])).toBeLessThan(500)
      if (encoding === 'gzip') expect(answer.text ?? answer.body.toString()).toBe(SCRIPT)
    }
  })

  it('is 404 for a file that is not there, rather than the page in its place', async () => {
    for (const path of ['/assets/index-Old.js', '/favicon.png', '/assets/index-Old.js.map']) {
      expect([path, (await get(path, 'gzip')).status]).toEqual([path, 404])
    }
  })

  it('gives nothing from outside its folder', async () => {
    writeFileSync(join(folder, '..', 'outside.txt'), 'outside')
    for (const path of ['/..%2foutside.txt', '/assets/..%2f..%2foutside.txt', '/%2e%2e/outside.txt', '/assets/%00.js']) {
      const answer = await get(path, 'gzip')
      expect([path, answer.status >= 400 && answer.status < 500]).toEqual([path, true])
    }
  })

  it('does not answer for the API', async () => {
    const answer = await get('/api/nothing')
    expect([answer.status, answer.headers['content-type']]).toEqual([404, 'application/problem+json; charset=utf-8'])
  })

  it('is read only', async () => {
    expect((await app.anonymous().post('/houses').send({})).status).toBe(404)
  })

  describe('when it was not built', () => {
    it('says so, and how to build it', async () => {
      rmSync(join(folder, 'index.html'))
      const answer = await get('/')
      expect(answer.status).toBe(503)
      expect(answer.body.detail).toContain('npm run build')
    })
  })
})
