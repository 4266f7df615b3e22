import type { Room } from '../../../shared/schemas/room.ts'
import type { EstimateModel } from '../../composables/estimateModel.ts'

/** What cells and editors of the estimate grid may ask. */
export interface GridContext {
  model: EstimateModel
  rooms: () => readonly Room[]
  isReadOnly: boolean
}
