import type { Room } from '../../../shared/schemas/room.ts'
import type { EstimateModel } from '../../composables/estimateModel.ts'
import type { useGridEditing } from '../../composables/useGridEditing.ts'

/** What cells and editors of the estimate grid may ask. */
export interface GridContext {
  model: EstimateModel
  rooms: () => readonly Room[]
  isReadOnly: boolean
  /** What is keyed into a cell, at the moment that it is; the grid's own events come a moment later. */
  editing: Pick<ReturnType<typeof useGridEditing>, 'onStarted' | 'onStopped' | 'commit'>
}
