import { useQueryClient } from '@tanstack/vue-query'
import { computed, ref, useId } from 'vue'
import type { PriceItemFields } from '../../../shared/schemas/priceItem.ts'
import { bookItemsQuery, priceBookVersionsQuery } from '../../api/priceBook.ts'
import { useUndoToast } from '../../composables/useUndoToast.ts'
import { fieldsOf } from './draftEditor.ts'
import { itemPatch } from './itemForm.ts'
import { refOf, type PriceBook } from './usePriceBook.ts'

/** In the address, in the place of an item's key. No key is a single such word with a star. */
const NEW = '*new'

/** The item that is open with all its fields, and what is done to it. Which one it is stands in the address: the browser's back closes it. */
export function useItemPanel(book: PriceBook) {
  const queries = useQueryClient()
  const { offerUndo, say, sayProblem } = useUndoToast()
  const formId = useId()
  const isSaving = ref(false)
  const isDropping = ref(false)
  const isNew = computed(() => book.address.item.value === NEW && book.isEditing.value)
  const item = computed(() => (isNew.value ? null : book.openItem.value))
  const isOpen = computed(() => isNew.value || item.value !== null)
  const title = computed(() => item.value?.name ?? 'A new item')

  const regionName = computed(() => (book.regionKey.value === null ? null : book.regionName.value))
  const close = () => book.address.go({ item: null })
  const place = (key: string) => ({ key, regionKey: book.regionKey.value })

  /** Throws what the server refused, for the form to show. */
  async function save(fields: PriceItemFields): Promise<void> {
    isSaving.value = true
    try {
      await saveOpen(fields)
    } finally {
      isSaving.value = false
    }
    close()
  }

  async function saveOpen(fields: PriceItemFields): Promise<void> {
    const editor = book.editor.value
    if (item.value === null) {
      await editor.add(fields)
      say(`${fields.name} is in the draft`)
      return
    }
    const patch = itemPatch(fieldsOf(item.value), fields)
    if (patch !== null) await editor.save(place(item.value.key), patch)
  }

  /** Lets a region pay the base prices by its factors again. */
  async function dropOwn(): Promise<void> {
    const own = item.value
    if (!own) return
    try {
      await book.editor.value.dropOwn(place(own.key))
      await queries.invalidateQueries({ queryKey: ['price-book'] })
      close()
      offerUndo(`${own.name}: back to the base prices`, () => book.editor.value.undo())
    } catch (error) {
      sayProblem(error)
    }
  }

  /** Drops the item that is open, and with it what regions pay of their own for it. */
  async function drop(): Promise<void> {
    const [dropped, shown] = [item.value, book.shown.value]
    if (!dropped || !shown) return
    const editor = book.editor.value
    await editor.drop(dropped.key, await ownRowsOf(dropped.key, refOf(shown)))
    close()
    offerUndo(`${dropped.name} dropped from the draft`, () => editor.undo().then(() => queries.invalidateQueries(priceBookVersionsQuery)))
  }

  async function ownRowsOf(key: string, ref_: ReturnType<typeof refOf>) {
    const perRegion = await Promise.all(
      book.regions.value.map(async (region) => {
        const items = await queries.fetchQuery(bookItemsQuery(ref_, region.key))
        const own = items.find((one) => one.key === key && one.isRegionsOwn)
        return own ? [{ regionKey: region.key, item: own }] : []
      }),
    )
    return perRegion.flat()
  }

  return {
    item,
    isOpen,
    isDropping,
    title,
    open: (key: string) => book.address.go({ item: key }, true),
    openNew: () => book.address.go({ item: NEW, region: null }, true),
    close,
    drop,
    dropOwn,
    actions: computed(() => ({
      item: item.value,
      isEditing: book.isEditing.value,
      regionName: regionName.value,
      formId,
      isBusy: isSaving.value,
    })),
    bindings: computed(() => ({
      item: item.value,
      before: item.value ? (book.itemsBefore.value?.get(item.value.key) ?? null) : null,
      isEditing: book.isEditing.value,
      regionName: regionName.value,
      formId,
      today: new Date().toISOString().slice(0, 10),
      save,
    })),
  }
}
