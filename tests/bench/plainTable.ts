import { once } from 'node:events'
import { createServer } from 'node:http'
import type { AddressInfo } from 'node:net'
import { computeEstimate, formatCents, readEstimateDocument } from '../../shared/engine/index.ts'
import { estimateDocumentOf } from './estimateDocumentOf.ts'

/** Serves, of the loopback, the lines of a bench's estimate and their total as a plain HTML table that was made beforehand: the floor under a page with a grid. */
export async function serveEstimateTable(lineCount: number): Promise<{ url: string; stop(): Promise<void> }> {
  const html = Buffer.from(tableOf(lineCount))
  const server = createServer((_req, res) => {
    res.writeHead(200, { 'content-type': 'text/html; charset=utf-8', 'content-length': html.length })
    res.end(html)
  })
  server.listen(0, '127.0.0.1')
  await once(server, 'listening')
  return {
    url: `http://127.0.0.1:${(server.address() as AddressInfo).port}/`,
    async stop() {
      server.closeAllConnections()
      server.close()
      await once(server, 'close')
    },
  }
}

function tableOf(lineCount: number): string {
  const read = readEstimateDocument(estimateDocumentOf(lineCount))
  if (!read.ok) throw new Error("The bench's own document can't be read.")
  const { lines, totals } = computeEstimate(read.input)
  const rows = read.document.lines.map((line, index) => {
    const figures = lines[index]!
    const { low, likely, high } = figures.amountCents
    const cells = [line.description, line.room, line.quantity, figures.quantity, line.unit, line.basis]
    const amounts = `<td class="amount">${formatCents(likely)}</td><td>${formatCents(low)} to ${formatCents(high)}</td>`
    return `<tr>${cells.map((cell) => `<td>${cell}</td>`).join('')}${amounts}</tr>`
  })
  return `<!doctype html><title>Plain table</title><p class="total">${formatCents(totals.totalCents.likely)}</p><table>${rows.join('')}</table>`
}
