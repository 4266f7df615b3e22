import type { CurrentUser } from '../../../shared/schemas/account.ts'
import type { Database } from '../../db/client.ts'
import { notFound } from '../../errors/AppError.ts'
import { isOpenTo } from '../houses/houseAccess.ts'
import { findEstimateHead, type EstimateHead } from './estimateRepository.ts'

/** The head of an estimate whose house is there and open to the person; 404 otherwise. */
export function openEstimateHead(db: Database, user: CurrentUser, estimateId: string): EstimateHead {
  const head = findEstimateHead(db, estimateId)
  if (!head || !isOpenTo(db, user, head.houseId)) throw notFound('estimate')
  return head
}
