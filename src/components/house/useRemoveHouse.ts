import { useQueryClient } from '@tanstack/vue-query'
import { ref } from 'vue'
import { housesQuery, removeHouse, restoreHouse } from '../../api/houses.ts'
import { useUndoToast } from '../../composables/useUndoToast.ts'

/** Removes a house and offers to bring it back. `onRemoved` is called while the house still stands in the list on the screen. */
export function useRemoveHouse(onRemoved: () => void) {
  const queries = useQueryClient()
  const { offerUndo, sayProblem } = useUndoToast()
  const isBusy = ref(false)

  async function restore(houseId: string): Promise<void> {
    await restoreHouse(houseId)
    await queries.invalidateQueries(housesQuery)
  }

  async function remove({ id, name }: { id: string; name: string }): Promise<void> {
    isBusy.value = true
    try {
      await removeHouse(id)
      onRemoved()
      queries.setQueryData(housesQuery.queryKey, (houses) => houses?.filter((house) => house.id !== id))
      offerUndo(`${name} removed`, () => restore(id))
    } catch (error) {
      sayProblem(error)
      await queries.invalidateQueries(housesQuery)
    } finally {
      isBusy.value = false
    }
  }

  return { isBusy, remove }
}
