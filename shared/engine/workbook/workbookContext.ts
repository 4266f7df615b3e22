/** What a price item was called when the estimate's version of the book was published. */
export interface WorkbookPriceItem {
  key: string
  name: string
  unit: string
  /** ISO date. */
  priceDate: string
}

/** What a workbook says that the estimate itself doesn't hold. */
export interface WorkbookContext {
  firm: { name: string; isDemo: boolean }
  regionName: string
  priceBook: { version: number; effectiveDate: string | null }
  /** The items that the lines name. */
  items: readonly WorkbookPriceItem[]
  /** ISO time of the last change to what the figures follow from. */
  figuresAt: string
  preparedBy: string
  preparedFor: readonly string[]
}
