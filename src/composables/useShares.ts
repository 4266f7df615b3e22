import { useQueryClient } from '@tanstack/vue-query'
import { ref, toValue, type MaybeRefOrGetter } from 'vue'
import { shareHouse, sharesQuery, unshareHouse } from '../api/sharing.ts'
import type { HouseShare } from '../../shared/schemas/sharing.ts'
import { useUndoToast } from './useUndoToast.ts'

/** Opens a house to an owner and closes it again; closing can be undone. */
export function useShares(houseId: MaybeRefOrGetter<string>) {
  const queries = useQueryClient()
  const { offerUndo, sayProblem } = useUndoToast()
  const isBusy = ref(false)

  function readAgain(): Promise<void> {
    return queries.invalidateQueries({ queryKey: sharesQuery(toValue(houseId)).queryKey })
  }

  async function share(userId: string): Promise<void> {
    isBusy.value = true
    try {
      await shareHouse(toValue(houseId), userId)
      await readAgain()
    } finally {
      isBusy.value = false
    }
  }

  async function unshare({ userId, name }: HouseShare): Promise<void> {
    try {
      await unshareHouse(toValue(houseId), userId)
      offerUndo(`No longer shared with ${name}.`, () => share(userId))
    } catch (error) {
      sayProblem(error)
    }
    await readAgain()
  }

  return { share, unshare, isBusy }
}
