import { z } from 'zod'
import { SYSTEM_KEYS } from '../../../shared/catalogue/houseSystems.ts'
import { keySchema, versionSchema } from '../../../shared/schemas/common.ts'
import {
  priceBookVersionSchema,
  priceItemFieldsSchema,
  priceItemPatchSchema,
  priceItemSchema,
  priceRegionSchema,
  publishSchema,
  regionPatchSchema,
} from '../../../shared/schemas/priceItem.ts'
import { setEtag } from '../../http/etag.ts'
import { operation, type Operation } from '../../http/operation.ts'
import type { DraftService } from './draftService.ts'
import type { PriceBookService } from './priceBookService.ts'

const versionParams = z.object({ version: z.coerce.number().pipe(versionSchema) })
const itemQuery = z.object({
  search: z.string().max(200).optional(),
  system: z.enum(SYSTEM_KEYS).optional(),
  region: keySchema.optional(),
  limit: z.coerce.number().int().min(1).max(1000).optional(),
})
/** A region: its own row of the item; left out, the base row. */
const rowQuery = z.object({ region: keySchema.optional() })
const keyParams = z.object({ key: keySchema })

export function priceBookOperations({ priceBook, drafts }: { priceBook: PriceBookService; drafts: DraftService }): Operation[] {
  return [
    operation(
      {
        id: 'listPriceBookVersions',
        method: 'get',
        path: '/price-book/versions',
        action: 'price-book.read',
        summary: 'The versions of the price book, newest first; an open draft is among them.',
        response: z.array(priceBookVersionSchema),
      },
      () => priceBook.listVersions(),
    ),
    operation(
      {
        id: 'searchPriceItems',
        method: 'get',
        path: '/price-book/versions/:version/items',
        action: 'price-book.read',
        summary: 'Items of a version: all, or those that hold every word of the search by its beginning. With a region, at what it pays.',
        params: versionParams,
        query: itemQuery,
        response: z.array(priceItemSchema),
      },
      ({ params, query }) => priceBook.searchItems(params.version, query),
    ),
    operation(
      {
        id: 'listRegions',
        method: 'get',
        path: '/price-book/versions/:version/regions',
        action: 'price-book.read',
        summary: 'Price regions of a version, with their factors and sales tax.',
        params: versionParams,
        response: z.array(priceRegionSchema),
      },
      ({ params }) => priceBook.listRegions(params.version),
    ),
    ...draftOperations(drafts),
  ]
}

function draftOperations(drafts: DraftService): Operation[] {
  return [
    operation(
      {
        id: 'startDraft',
        method: 'post',
        path: '/price-book/draft',
        action: 'price-book.write',
        summary: 'Begins the draft of the next version.',
        status: 201,
        response: priceBookVersionSchema,
      },
      ({ user }) => drafts.start(user),
    ),
    operation(
      {
        id: 'dropDraft',
        method: 'delete',
        path: '/price-book/draft',
        action: 'price-book.write',
        summary: 'Throws the draft away.',
        status: 204,
      },
      ({ user }) => drafts.drop(user),
    ),
    operation(
      {
        id: 'addDraftItem',
        method: 'post',
        path: '/price-book/draft/items',
        action: 'price-book.write',
        summary: 'Adds an item to the draft; with a region, that region’s own prices for an item.',
        status: 201,
        query: rowQuery,
        body: priceItemFieldsSchema,
        response: priceItemSchema,
      },
      ({ user, body, query, res }) => {
        const item = drafts.addItem(user, body, query.region ?? null)
        setEtag(res, item.rowVersion)
        return item
      },
    ),
    operation(
      {
        id: 'updateDraftItem',
        method: 'patch',
        path: '/price-book/draft/items/*key',
        action: 'price-book.write',
        summary: 'Changes an item in the draft.',
        ifMatch: true,
        params: keyParams,
        query: rowQuery,
        body: priceItemPatchSchema,
        response: priceItemSchema,
      },
      ({ user, params, query, body, ifMatch, res }) => {
        const item = drafts.updateItem(user, { key: params.key, regionKey: query.region ?? null }, body, ifMatch)
        setEtag(res, item.rowVersion)
        return item
      },
    ),
    operation(
      {
        id: 'dropDraftItem',
        method: 'delete',
        path: '/price-book/draft/items/*key',
        action: 'price-book.write',
        summary: 'Ends an item with the draft’s version.',
        status: 204,
        ifMatch: true,
        params: keyParams,
        query: rowQuery,
      },
      ({ user, params, query, ifMatch }) => drafts.dropItem(user, { key: params.key, regionKey: query.region ?? null }, ifMatch),
    ),
    operation(
      {
        id: 'updateDraftRegion',
        method: 'patch',
        path: '/price-book/draft/regions/:key',
        action: 'price-book.write',
        summary: 'Changes a region’s factors or its sales tax in the draft.',
        ifMatch: true,
        params: keyParams,
        body: regionPatchSchema,
        response: priceRegionSchema,
      },
      ({ user, params, body, ifMatch, res }) => {
        const region = drafts.updateRegion(user, params.key, body, ifMatch)
        setEtag(res, region.rowVersion)
        return region
      },
    ),
    operation(
      {
        id: 'publishDraft',
        method: 'post',
        path: '/price-book/draft/publish',
        action: 'price-book.write',
        summary: 'Makes the draft the newest published version, for good.',
        body: publishSchema,
        response: priceBookVersionSchema,
      },
      ({ user, body }) => drafts.publish(user, body),
    ),
  ]
}
