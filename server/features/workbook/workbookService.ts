import type { CurrentUser } from '../../../shared/schemas/account.ts'
import type { WorkbookContext } from '../../../shared/engine/index.ts'
import type { AppConfig } from '../../config/appConfig.ts'
import type { Database } from '../../db/client.ts'
import { notFound } from '../../errors/AppError.ts'
import { fileTitle } from '../../http/fileTitle.ts'
import type { MakeWorkbook } from '../../workers/workbookThread.ts'
import type { EstimateService } from '../estimates/estimateService.ts'
import { findFirm } from '../firm/firmRepository.ts'
import type { PriceBookService } from '../price-book/priceBookService.ts'
import { findSharer, findShares } from '../sharing/shareRepository.ts'
import { findUsedItems, findWorkbookHead, type WorkbookHead } from './workbookRepository.ts'

interface WorkbookParts {
  db: Database
  config: AppConfig
  estimates: EstimateService
  priceBook: PriceBookService
  makeWorkbook: MakeWorkbook
}

export interface WorkbookFile {
  content: Buffer
  fileName: string
  /** Of the estimate that it was made from. */
  version: number
}

export type WorkbookService = ReturnType<typeof createWorkbookService>

/** Estimates as workbooks. */
export function createWorkbookService({ db, config, estimates, priceBook, makeWorkbook }: WorkbookParts) {
  function contextOf(user: CurrentUser, estimateId: string, head: WorkbookHead): WorkbookContext {
    const firm = findFirm(db)
    const firmName = config.firmName ?? firm?.name ?? 'Quoinbook'
    const region = priceBook.findRegion(db, head.priceBookVersion, head.regionKey)
    const preparedBy = user.role === 'owner' ? (findSharer(db, head.houseId, user.id)?.name ?? firmName) : user.name
    return {
      firm: { name: firmName, isDemo: firm?.isDemo ?? false },
      regionName: region?.name ?? head.regionKey,
      priceBook: {
        version: head.priceBookVersion,
        effectiveDate: priceBook.findVersionHead(db, head.priceBookVersion)?.effectiveDate ?? null,
      },
      items: findUsedItems(db, estimateId, head),
      figuresAt: head.updatedAt,
      preparedBy,
      preparedFor: findShares(db, head.houseId).map(({ name }) => name),
    }
  }

  return {
    /** The workbook of an estimate that is open to the person; 404 otherwise. */
    async make(user: CurrentUser, estimateId: string): Promise<WorkbookFile> {
      const { text, version } = estimates.readWholeText(user, estimateId)
      const head = findWorkbookHead(db, estimateId)
      if (!head) throw notFound('estimate')
      const content = await makeWorkbook(text, contextOf(user, estimateId, head))
      return { content, fileName: `${fileTitle(head.houseName)}, estimate.xlsx`, version }
    },
  }
}
