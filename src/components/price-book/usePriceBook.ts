import { useQuery, useQueryClient } from '@tanstack/vue-query'
import { computed, shallowRef, watch } from 'vue'
import { useRoute, useRouter } from 'vue-router'
import type { PriceBookVersion } from '../../../shared/schemas/priceItem.ts'
import {
  addDraftItem,
  bookItemsQuery,
  bookRegionsQuery,
  dropDraftItem,
  priceBookVersionsQuery,
  updateDraftItem,
  type BookVersionRef,
} from '../../api/priceBook.ts'
import { ProblemError } from '../../api/ProblemError.ts'
import { usePermissions } from '../../composables/usePermissions.ts'
import { useUndoToast } from '../../composables/useUndoToast.ts'
import { createDraftEditor } from './draftEditor.ts'
import { createRowMaker, type GridRow } from './gridRows.ts'
import type { CellField } from './itemFields.ts'
import { itemMatcher } from './itemMatcher.ts'

export type PriceBook = ReturnType<typeof usePriceBook>

/** The version, region, system and words that are looked at: kept in the address, so that a reload or a link shows the same. */
function usePriceBookAddress() {
  const route = useRoute()
  const router = useRouter()
  const textOf = (name: string) => computed(() => (typeof route.query[name] === 'string' ? route.query[name] : null))
  function go(changes: Record<string, string | null>, isStep = false): void {
    const query = { ...route.query, ...changes }
    const given = Object.fromEntries(Object.entries(query).filter(([, value]) => value !== null && value !== ''))
    void (isStep ? router.push({ query: given }) : router.replace({ query: given }))
  }
  return { version: textOf('version'), region: textOf('region'), system: textOf('system'), item: textOf('item'), go }
}

/** Everything that the price-book page shows and does. */
export function usePriceBook() {
  const address = usePriceBookAddress()
  const queries = useQueryClient()
  const { may } = usePermissions()
  const { sayProblem } = useUndoToast()
  const search = shallowRef('')

  const versionsRead = useQuery(priceBookVersionsQuery)
  const versions = computed(() => versionsRead.data.value ?? [])
  const draft = computed(() => versions.value.find(({ status }) => status === 'draft') ?? null)
  const mayWrite = computed(() => may('price-book.write'))
  const shown = computed(() => shownVersion(versions.value, address.version.value, mayWrite.value))
  const before = computed(() => versionBefore(versions.value, shown.value))
  const isEditing = computed(() => shown.value?.status === 'draft' && mayWrite.value)
  const regionKey = computed(() => address.region.value)

  const refs = computed(() => (shown.value ? { shown: refOf(shown.value), before: before.value ? refOf(before.value) : null } : null))
  const NO_VERSION: BookVersionRef = { version: 0, isDraft: false }
  const itemsRead = useQuery(
    computed(() => ({ ...bookItemsQuery(refs.value?.shown ?? NO_VERSION, regionKey.value), enabled: refs.value !== null })),
  )
  const [regionsRead, itemsBeforeRead] = [
    useQuery(computed(() => ({ ...bookRegionsQuery(refs.value?.shown ?? NO_VERSION), enabled: refs.value !== null }))),
    useQuery(
      computed(() => ({
        ...bookItemsQuery(refs.value?.before ?? NO_VERSION, regionKey.value),
        enabled: shown.value?.status === 'draft' && Boolean(refs.value?.before),
      })),
    ),
  ]
  const regions = computed(() => regionsRead.data.value ?? [])

  const newEditor = () =>
    createDraftEditor({ update: updateDraftItem, add: addDraftItem, drop: dropDraftItem }, (error) => {
      sayProblem(error)
      const isGone = error instanceof ProblemError && error.code === 'no-draft'
      if (isGone) void queries.invalidateQueries(priceBookVersionsQuery)
    })
  const editor = shallowRef(newEditor())
  // Another draft, be it under the same number, has nothing to do with the edits of this one.
  watch(
    () => draft.value?.version ?? null,
    () => (editor.value = newEditor()),
  )
  watch([itemsRead.data, editor], ([list]) => list && isEditing.value && editor.value.take(regionKey.value, list), { immediate: true })

  const items = computed(() => (isEditing.value ? editor.value.rows(regionKey.value) : (itemsRead.data.value ?? [])))
  const matches = computed(() => itemMatcher({ search: search.value, system: address.system.value }))
  const shownItems = computed(() => items.value.filter(matches.value))
  const itemsBefore = computed(() => {
    const list = shown.value?.status === 'draft' ? itemsBeforeRead.data.value : undefined
    return list ? new Map(list.map((item) => [item.key, item])) : null
  })
  const rowOf = createRowMaker()
  const rows = computed<GridRow[]>(() =>
    items.value.map((item) => {
      const old = itemsBefore.value ? (itemsBefore.value.get(item.key) ?? null) : undefined
      return rowOf(item, editor.value.heldOf({ key: item.key, regionKey: regionKey.value }), old)
    }),
  )
  const shownKeys = computed(() => new Set(shownItems.value.map(({ key }) => key)))

  function mayEdit(field: CellField): boolean {
    const isPrice = field.includes('.') || field === 'minimumChargeCents'
    return isEditing.value && (regionKey.value === null || isPrice)
  }

  return {
    address,
    search,
    versions,
    versionsRead,
    draft,
    shown,
    before,
    mayWrite,
    isEditing,
    regionKey,
    regions,
    regionName: computed(() => regions.value.find(({ key }) => key === regionKey.value)?.name ?? null),
    itemsRead,
    items,
    shownItems,
    rows,
    shownKeys,
    itemsBefore,
    editor,
    mayEdit,
    openItem: computed(() => items.value.find(({ key }) => key === address.item.value) ?? null),
    refetchVersions: () => queries.invalidateQueries(priceBookVersionsQuery),
  }
}

export function refOf({ version, status }: PriceBookVersion): BookVersionRef {
  return { version, isDraft: status === 'draft' }
}

/** The version that the address names; else the draft for who may edit it, and the newest published one for everybody else. */
function shownVersion(versions: readonly PriceBookVersion[], wanted: string | null, mayWrite: boolean): PriceBookVersion | null {
  const named = versions.find(({ version }) => String(version) === wanted)
  if (named) return named
  const usual = versions.find(({ status }) => mayWrite || status === 'published')
  return usual ?? null
}

function versionBefore(versions: readonly PriceBookVersion[], shown: PriceBookVersion | null): PriceBookVersion | null {
  if (!shown) return null
  return versions.find(({ version, status }) => status === 'published' && version < shown.version) ?? null
}
