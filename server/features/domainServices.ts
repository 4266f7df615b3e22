import type { Clock } from '../config/clock.ts'
import type { Database } from '../db/client.ts'
import { createEstimateKeeper } from './estimates/estimateKeeper.ts'
import { createEstimateService } from './estimates/estimateService.ts'
import { createLineMaker } from './estimates/lineMaker.ts'
import { createLineRepricer } from './estimates/lineRepricer.ts'
import { createLineService } from './estimates/lineService.ts'
import type { EventHub } from './events/eventHub.ts'
import { createExchangeService } from './exchange/exchangeService.ts'
import { createHouseService } from './houses/houseService.ts'
import { createDraftService } from './price-book/draftService.ts'
import { createPriceBookService } from './price-book/priceBookService.ts'
import { createRoomService } from './rooms/roomService.ts'
import { createShareService } from './sharing/shareService.ts'
import { createSummaryService } from './summary/summaryService.ts'

export type DomainServices = ReturnType<typeof createDomainServices>

/** The services around a house and its estimate, from the price book up. */
export function createDomainServices(parts: { db: Database; clock: Clock; events: EventHub }) {
  const priceBook = createPriceBookService(parts)
  const keeper = createEstimateKeeper(parts)
  const repricer = createLineRepricer({ ...parts, priceBook })
  const maker = createLineMaker({ priceBook })
  const estimates = createEstimateService({ ...parts, keeper })
  return {
    priceBook,
    drafts: createDraftService(parts),
    houses: createHouseService({ ...parts, priceBook, keeper, repricer }),
    rooms: createRoomService({ ...parts, keeper }),
    estimates,
    lines: createLineService({ ...parts, keeper, maker }),
    shares: createShareService(parts),
    summaries: createSummaryService({ ...parts, estimates, priceBook }),
    exchange: createExchangeService({ ...parts, estimates, priceBook, keeper }),
  }
}
