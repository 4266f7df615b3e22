import ExcelJS from 'exceljs'

/** The earliest time that a zip can hold. */
const PART_DATE = new Date(Date.UTC(1980, 0, 1))
const WORKBOOK_PART = '/xl/workbook.xml'
const STYLES_PART = 'xl/styles.xml'

interface Zip {
  append(content: unknown, part: { name: string; date?: Date }): unknown
}

/**
 * The library's streaming writer, with three things it has no option for: each part of the package is dated alike, so that the same estimate
 * gives the same bytes; the workbook recalculates when it's opened; text that looks like a formula carries the quote prefix.
 */
export class SteadyWorkbookWriter extends ExcelJS.stream.xlsx.WorkbookWriter {
  /** The first part that the constructor writes, and so the first moment to stand between the writer and its zip. */
  override addThemes(): Promise<void> {
    const { zip } = this as unknown as { zip: Zip }
    const append = zip.append.bind(zip)
    zip.append = (content, part) =>
      append(typeof content === 'string' ? steadied(part.name, content) : content, { ...part, date: PART_DATE })
    return super.addThemes()
  }
}

function steadied(part: string, xml: string): string {
  if (part === WORKBOOK_PART) return xml.replace('<calcPr calcId="171027"', '$& fullCalcOnLoad="1"')
  // 49 is the built-in number of the text format, which only such cells have.
  if (part === STYLES_PART) return xml.replaceAll('<xf numFmtId="49"', '<xf quotePrefix="1" numFmtId="49"')
  return xml
}
