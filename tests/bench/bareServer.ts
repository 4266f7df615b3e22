import { createServer, type IncomingMessage, type ServerResponse } from 'node:http'
import BetterSqlite3 from 'better-sqlite3'

/**
 * What the server is compared with: node:http over the same database file with the same statements, prepared, and nothing else.
 * It signs nobody in, checks nothing and computes no totals. Run as `bareServer.ts DATABASE PORT`; it says `ready`.
 *
 * `GET /rows/ESTIMATE` turns rows into objects and these into text, `GET /text/ESTIMATE` has SQLite make the text, `PATCH /lines/ESTIMATE/LINE` saves a quantity.
 */
const [databasePath = '', port = '0'] = process.argv.slice(2)
const db = new BetterSqlite3(databasePath)
db.pragma('journal_mode = WAL')
db.pragma('foreign_keys = ON')
db.pragma('synchronous = FULL')

type Row = Record<string, unknown>

const readEstimate = db.prepare<[string], Row>('select * from estimates where id = ?')
const readHouse = db.prepare<[unknown], Row>('select * from houses where id = ?')
const readRooms = db.prepare<[unknown], Row>('select * from rooms where house_id = ? and removed_at is null order by position, id')
const readLines = db.prepare<[string], Row>(
  'select * from estimate_lines where estimate_id = ? and removed_at is null order by position, id',
)
const readLine = db.prepare<[string], Row>('select * from estimate_lines where id = ?')
const updateLine = db.prepare('update estimate_lines set quantity = ?, version = version + 1, updated_at = ? where id = ?')
const updateEstimate = db.prepare('update estimates set version = version + 1, totals = ?, updated_at = ? where id = ?')
const insertAudit = db.prepare(
  'insert into audit_entries (at, actor_id, what, what_id, action, before, after) values (?, null, ?, ?, ?, ?, ?)',
)
/** The app's own statement. Loaded at its first use, so that a start is measured without it. */
const readText = lazily(async () => {
  const { databaseOver } = await import('../../server/db/client.ts')
  const { prepareEstimateWhole } = await import('../../server/features/estimates/estimateWholeQuery.ts')
  return prepareEstimateWhole(databaseOver(db))
})

const JSON_COLUMNS = [
  ...['settings', 'unknowns', 'inspections', 'totals', 'footprint', 'roof', 'shape', 'ceiling', 'openings', 'deductions'],
  ...['override', 'book_materials', 'book_installed'],
]

function withJson(row: Row | undefined): Row {
  const parsed = { ...row }
  for (const column of JSON_COLUMNS) if (typeof parsed[column] === 'string') parsed[column] = JSON.parse(parsed[column])
  return parsed
}

function wholeOfRows(id: string): string {
  const estimate = withJson(readEstimate.get(id))
  return JSON.stringify({
    estimate,
    house: withJson(readHouse.get(estimate.house_id)),
    rooms: readRooms.all(estimate.house_id).map(withJson),
    lines: readLines.all(id).map(withJson),
  })
}

const saveLine = db.transaction((estimateId: string, lineId: string, quantity: string) => {
  const at = new Date().toISOString()
  const estimate = readEstimate.get(estimateId)
  const before = readLine.get(lineId)
  updateLine.run(quantity, at, lineId)
  const after = { ...before, quantity, version: Number(before?.version) + 1 }
  updateEstimate.run(estimate?.totals, at, estimateId)
  insertAudit.run(at, 'line', lineId, 'update', JSON.stringify(before), JSON.stringify(after))
  return JSON.stringify({ line: after, totals: JSON.parse(String(estimate?.totals)) as unknown })
})

createServer((req, res) => void answer(req, res)).listen(Number(port), '127.0.0.1', () => process.stdout.write('ready\n'))

async function answer(req: IncomingMessage, res: ServerResponse): Promise<void> {
  const [, what, estimateId = '', lineId = ''] = (req.url ?? '').split('/')
  if (what === 'rows') return send(res, wholeOfRows(estimateId))
  if (what === 'text') return send(res, (await readText())(estimateId) ?? '')
  if (what === 'lines') {
    const { quantity } = JSON.parse(await bodyOf(req)) as { quantity: string }
    return send(res, saveLine.immediate(estimateId, lineId, quantity))
  }
  send(res, '{}')
}

function send(res: ServerResponse, text: string): void {
  res.writeHead(200, { 'content-type': 'application/json', 'content-length': Buffer.byteLength(text) })
  res.end(text)
}

async function bodyOf(req: IncomingMessage): Promise<string> {
  const chunks: Buffer[] = []
  for await (const chunk of req) chunks.push(chunk as Buffer)
  return Buffer.concat(chunks).toString()
}

function lazily<T>(make: () => Promise<T>): () => Promise<T> {
  let made: Promise<T> | null = null
  return () => (made ??= make())
}
