import type { Line, LinePatch, NewLine } from '../../../shared/schemas/estimate.ts'
import type { Queryable } from '../../db/client.ts'
import { invalid } from '../../errors/AppError.ts'
import type { PriceBookService, PricedItem } from '../price-book/priceBookService.ts'
import { requireOwnLineFields } from './checkLine.ts'
import type { EstimateHead } from './estimateRepository.ts'
import { fillFromItem, OWN_LINE_START, suggestedQuantity } from './lineFill.ts'

export type LineMaker = ReturnType<typeof createLineMaker>
type LineContent = Omit<Line, 'id' | 'estimateId' | 'position' | 'version'>

/** Makes lines of what a person keyed and what comes along with the price item. */
export function createLineMaker({ priceBook }: { priceBook: PriceBookService }) {
  /** The item at the prices of the estimate's region and pinned version. */
  function findPriced(tx: Queryable, { priceBookVersion, regionKey }: EstimateHead, itemKey: string): PricedItem | null {
    const region = priceBook.findRegion(tx, priceBookVersion, regionKey)
    return region && priceBook.findPricedItem(tx, priceBookVersion, region, itemKey)
  }

  function pricedOrRefused(tx: Queryable, head: EstimateHead, itemKey: string): PricedItem {
    const priced = findPriced(tx, head, itemKey)
    if (priced) return priced
    const message = `is not in version ${head.priceBookVersion} of the price book, which this estimate is pinned to`
    throw invalid([{ path: 'itemKey', code: 'unknown-item', message }])
  }

  /** The quantity after a move between a room and the house: the item's formula goes along while nobody has changed it. */
  function quantityAfterMove(tx: Queryable, head: EstimateHead, line: Line, roomId: string | null): string {
    const hasMoved = (roomId === null) !== (line.roomId === null)
    const priced = hasMoved && line.itemKey !== null ? findPriced(tx, head, line.itemKey) : null
    const isUntouched = priced !== null && line.quantity === suggestedQuantity(priced.item, line.roomId)
    return isUntouched ? suggestedQuantity(priced.item, roomId) : line.quantity
  }

  return {
    /** A new line: filled from its item, or the estimator's own. Throws 422 for an item that the pinned version doesn't have. */
    make(tx: Queryable, head: EstimateHead, { itemKey, ...given }: Omit<NewLine, 'afterLineId'>): LineContent {
      const start = { evidence: 'seen', note: '' } as const
      if (itemKey !== undefined && itemKey !== null) {
        return { ...start, ...fillFromItem(pricedOrRefused(tx, head, itemKey), given.roomId), ...given }
      }
      const { description, unit, override } = requireOwnLineFields(given)
      return { ...start, ...OWN_LINE_START, ...given, description, unit, override }
    },

    /** A line as changed: another item fills it anew, none makes it the estimator's own. */
    change(tx: Queryable, head: EstimateHead, line: Line, { itemKey, ...fields }: LinePatch): Line {
      const changed = { ...line, ...fields }
      if (itemKey === undefined || itemKey === line.itemKey) {
        return { ...changed, quantity: fields.quantity ?? quantityAfterMove(tx, head, line, changed.roomId) }
      }
      if (itemKey === null) return { ...changed, itemKey, book: { materials: null, installed: null } }
      return { ...line, ...fillFromItem(pricedOrRefused(tx, head, itemKey), changed.roomId), ...fields }
    },
  }
}
