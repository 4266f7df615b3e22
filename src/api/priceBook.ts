import { queryOptions } from '@tanstack/vue-query'
import type {
  PriceBookVersion,
  PriceItem,
  PriceItemFields,
  PriceItemPatch,
  PriceRegion,
  RegionPatch,
} from '../../shared/schemas/priceItem.ts'
import { http } from './http.ts'

/** A version to read. What is published never changes and is read once; the draft is read again when a live event tells of it. */
export interface BookVersionRef {
  version: number
  isDraft: boolean
}

/** An item's row: the base row (`regionKey` null), or a region's own. */
export interface ItemRowRef {
  key: string
  regionKey: string | null
  rowVersion: number
}

export const priceBookVersionsQuery = queryOptions({
  queryKey: ['price-book', 'versions'],
  queryFn: ({ signal }) => http.get<PriceBookVersion[]>('/price-book/versions', { signal }),
})

/** Every item of a version: its base prices, or what one region pays. */
export function bookItemsQuery({ version, isDraft }: BookVersionRef, regionKey: string | null) {
  return queryOptions({
    queryKey: isDraft ? ['price-book', 'items', version, regionKey] : ['price-items', version, regionKey],
    queryFn: ({ signal }) => http.get<PriceItem[]>(`/price-book/versions/${version}/items`, { signal, query: { region: regionKey } }),
    staleTime: isDraft ? 0 : Infinity,
    // The page compares row by row by version: a deep comparison of thousands of items would only cost time.
    structuralSharing: false,
  })
}

export function bookRegionsQuery({ version, isDraft }: BookVersionRef) {
  return queryOptions({
    queryKey: isDraft ? ['price-book', 'regions', version] : ['price-items', version, 'regions'],
    queryFn: ({ signal }) => http.get<PriceRegion[]>(`/price-book/versions/${version}/regions`, { signal }),
    staleTime: isDraft ? 0 : Infinity,
  })
}

/** Throws a 409 `ProblemError` when a draft is open already. */
export function startDraft(): Promise<PriceBookVersion> {
  return http.post<PriceBookVersion>('/price-book/draft')
}

export function dropDraft(): Promise<void> {
  return http.delete('/price-book/draft')
}

/** Throws a 409 `ProblemError` when the draft changes nothing. */
export function publishDraft(body: { note: string; effectiveDate: string }): Promise<PriceBookVersion> {
  return http.post<PriceBookVersion>('/price-book/draft/publish', body)
}

/** Adds an item to the draft; with a region, that region's own prices for an item that there is. */
export function addDraftItem(fields: PriceItemFields, regionKey: string | null): Promise<PriceItem> {
  return http.post<PriceItem>('/price-book/draft/items', fields, { query: { region: regionKey } })
}

/** Throws a stale `ProblemError` whose `current` is the item as somebody else left it. */
export function updateDraftItem({ key, regionKey, rowVersion }: ItemRowRef, patch: PriceItemPatch): Promise<PriceItem> {
  return http.patch<PriceItem>(itemPath(key), patch, { ifMatch: rowVersion, query: { region: regionKey } })
}

export function dropDraftItem({ key, regionKey, rowVersion }: ItemRowRef): Promise<void> {
  return http.delete(itemPath(key), { ifMatch: rowVersion, query: { region: regionKey } })
}

export function updateDraftRegion({ key, rowVersion }: Pick<PriceRegion, 'key' | 'rowVersion'>, patch: RegionPatch): Promise<PriceRegion> {
  return http.patch<PriceRegion>(`/price-book/draft/regions/${key}`, patch, { ifMatch: rowVersion })
}

/** Keys hold slashes, which stand in the address as they are; no other character of a key needs escaping. */
function itemPath(key: string): string {
  return `/price-book/draft/items/${key}`
}
