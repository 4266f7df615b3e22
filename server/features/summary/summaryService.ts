import { cautionsFor, documentNotices } from '../../../shared/catalogue/cautions.ts'
import { openEstimate, toEstimateInput } from '../../../shared/engine/index.ts'
import type { CurrentUser } from '../../../shared/schemas/account.ts'
import type { EstimateSummary } from '../../../shared/schemas/estimateSummary.ts'
import type { Database } from '../../db/client.ts'
import type { EstimateService } from '../estimates/estimateService.ts'
import type { PriceBookService } from '../price-book/priceBookService.ts'
import { findSharer } from '../sharing/shareRepository.ts'
import { basisAmounts, evidenceShares } from './lineShares.ts'
import { roomParts, systemParts, tradeParts } from './summaryParts.ts'
import { unknownParts } from './unknownParts.ts'

const NOT_ISSUED_NOTICE = 'This is a working estimate. It has not been issued: its figures change as the house is measured and priced.'

export type SummaryService = ReturnType<typeof createSummaryService>

/** What an owner reads of an estimate. */
export function createSummaryService({
  db,
  estimates,
  priceBook,
}: {
  db: Database
  estimates: EstimateService
  priceBook: PriceBookService
}) {
  return {
    read(user: CurrentUser, estimateId: string): EstimateSummary {
      const whole = estimates.readWhole(user, estimateId)
      const { estimate, house, lines } = whole
      const live = openEstimate(toEstimateInput(whole))
      const region = priceBook.findRegion(db, estimate.priceBookVersion, estimate.regionKey)
      const systems = [...new Set(lines.map(({ system }) => system))]
      return {
        estimateId,
        estimateVersion: estimate.version,
        house: {
          id: house.id,
          name: house.name,
          address: house.address,
          regionName: region?.name ?? estimate.regionKey,
          yearBuilt: house.yearBuilt,
          storeys: house.storeys,
          kind: house.kind,
        },
        priceBookVersion: estimate.priceBookVersion,
        priceBookDate: priceBook.findVersionHead(db, estimate.priceBookVersion)?.effectiveDate ?? null,
        totals: live.totals(),
        bySystem: systemParts(live),
        byRoom: roomParts(live, whole.rooms),
        byTrade: tradeParts(live),
        ...basisAmounts(live, lines),
        ownHandsHours: live.hours(),
        evidence: evidenceShares(live, lines),
        lineCount: lines.length,
        errorCount: live.errors().length,
        unknowns: unknownParts(estimate.unknowns),
        cautions: cautionsFor({ yearBuilt: house.yearBuilt, systems }).map(({ key, title, text, source }) => ({
          key,
          title,
          text,
          source,
        })),
        notIssuedNotice: NOT_ISSUED_NOTICE,
        notices: [...documentNotices],
        sharedBy: user.role === 'owner' ? findSharer(db, house.id, user.id) : null,
      }
    },
  }
}
