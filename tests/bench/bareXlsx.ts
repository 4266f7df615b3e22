import { promisify } from 'node:util'
import { crc32, deflateRaw } from 'node:zlib'
import { cellAddress } from '../../shared/engine/workbook/cellAddress.ts'
import type { WorkbookCell, WorkbookSheets } from '../../shared/engine/workbook/workbookModel.ts'

const deflate = promisify(deflateRaw)

/**
 * The floor under a workbook: the same cells as the least XML that says them, deflated and put in a zip, by hand.
 * No styles but a number for each, no print set-up, no names: what is left out is little beside the cells.
 */
export async function bareXlsx({ sheets }: WorkbookSheets): Promise<Buffer> {
  const styleNumbers = new Map<string, number>()
  const strings = new Map<string, number>()
  const parts = sheets.map(({ rows }, index) => ({
    name: `xl/worksheets/sheet${index + 1}.xml`,
    xml: `<worksheet><sheetData>${rows.map(({ cells }, row) => `<row r="${row + 1}">${rowXml(cells, row + 1)}</row>`).join('')}</sheetData></worksheet>`,
  }))
  const stringsXml = `<sst>${[...strings.keys()].map((text) => `<si><t>${escaped(text)}</t></si>`).join('')}</sst>`
  return zip([...parts, { name: 'xl/sharedStrings.xml', xml: stringsXml }])

  function rowXml(cells: readonly (WorkbookCell | undefined)[], row: number): string {
    let xml = ''
    for (let index = 0; index < cells.length; index += 1) {
      const cell = cells[index]
      if (cell) xml += cellXml(cell, cellAddress(row, index + 1))
    }
    return xml
  }

  function cellXml(cell: WorkbookCell, address: string): string {
    const style = numberOf(styleNumbers, cell.style)
    if (cell.formula !== undefined) {
      const type = typeof cell.result === 'string' ? ' t="str"' : ''
      return `<c r="${address}" s="${style}"${type}><f>${escaped(cell.formula)}</f><v>${escaped(String(cell.result))}</v></c>`
    }
    if (cell.value === null) return `<c r="${address}" s="${style}"/>`
    if (typeof cell.value === 'number') return `<c r="${address}" s="${style}"><v>${cell.value}</v></c>`
    return `<c r="${address}" s="${style}" t="s"><v>${numberOf(strings, cell.value)}</v></c>`
  }
}

function numberOf(known: Map<string, number>, text: string): number {
  const number = known.get(text) ?? known.size
  if (number === known.size) known.set(text, number)
  return number
}

const ESCAPES: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' }
function escaped(text: string): string {
  return text.replace(/[&<>"]/g, (character) => ESCAPES[character] ?? '')
}

async function zip(parts: readonly { name: string; xml: string }[]): Promise<Buffer> {
  const entries = await Promise.all(
    parts.map(async ({ name, xml }) => {
      const content = Buffer.from(xml)
      return { name: Buffer.from(name), content, deflated: await deflate(content) }
    }),
  )
  const chunks: Buffer[] = []
  const directory: Buffer[] = []
  let offset = 0
  for (const { name, content, deflated } of entries) {
    const fields = Buffer.alloc(26)
    fields.writeUInt16LE(20, 0)
    fields.writeUInt16LE(8, 4)
    fields.writeUInt32LE(crc32(content), 10)
    fields.writeUInt32LE(deflated.length, 14)
    fields.writeUInt32LE(content.length, 18)
    fields.writeUInt16LE(name.length, 22)
    const place = Buffer.alloc(14)
    place.writeUInt32LE(offset, 10)
    chunks.push(Buffer.from('PK\u0003\u0004', 'latin1'), fields, name, deflated)
    directory.push(Buffer.from('PK\u0001\u0002\u0014\u0000', 'latin1'), fields, place, name)
    offset += 4 + fields.length + name.length + deflated.length
  }
  const central = Buffer.concat(directory)
  const end = Buffer.alloc(22)
  end.write('PK\u0005\u0006', 'latin1')
  end.writeUInt16LE(entries.length, 8)
  end.writeUInt16LE(entries.length, 10)
  end.writeUInt32LE(central.length, 12)
  end.writeUInt32LE(offset, 16)
  return Buffer.concat([...chunks, central, end])
}
