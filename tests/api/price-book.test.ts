import { beforeEach, describe, expect, it } from 'vitest'
import { priceBookVersions } from '../../server/db/schema/priceBookVersions.ts'
import { priceItems } from '../../server/db/schema/priceItems.ts'
import { priceRegions } from '../../server/db/schema/priceRegions.ts'
import type { PriceItem } from '../../shared/schemas/priceItem.ts'
import { auditOf } from '../support/auditOf.ts'
import { addPriceBook, DEAR_REGION, DOOR_ITEM, PLAIN_REGION } from '../support/addPriceBook.ts'
import { keyedPriceItem } from '../support/keyedPriceItem.ts'
import { buildTestApp, type SignedIn, type TestApp } from '../support/buildTestApp.ts'
import { heardEvents } from '../support/heardEvents.ts'
import { queryPlans } from '../support/queryPlans.ts'

let app: TestApp
let admin: SignedIn['agent']
let estimator: SignedIn['agent']

beforeEach(() => {
  app = buildTestApp()
  admin = app.signInAs('admin').agent
  estimator = app.signInAs('estimator').agent
})

const PLANK = '/api/price-book/draft/items/floor/test-plank'

async function itemsOf(version: number, query = ''): Promise<PriceItem[]> {
  const answer = await admin.get(`/api/price-book/versions/${version}/items${query}`)
  expect(answer.status).toBe(200)
  return answer.body as PriceItem[]
}

async function itemOf(version: number, key: string, query = ''): Promise<PriceItem | undefined> {
  return (await itemsOf(version, query)).find((item) => item.key === key)
}

async function startDraft(): Promise<void> {
  expect((await admin.post('/api/price-book/draft')).status).toBe(201)
}

async function publish(): Promise<void> {
  const answer = await admin.post('/api/price-book/draft/publish').send({ note: 'Spring prices', effectiveDate: '2026-04-01' })
  expect(answer.status).toBe(200)
}

describe('GET /api/price-book/versions', () => {
  it('lists the versions newest first, with what each holds and changes', async () => {
    addPriceBook(app.db)
    await startDraft()
    await admin.patch(PLANK).set('If-Match', '"1"').send({ note: 'Thicker plank.' })

    const answer = await estimator.get('/api/price-book/versions')

    expect(answer.status).toBe(200)
    expect(answer.body).toMatchObject([
      { version: 2, status: 'draft', publishedAt: null, itemCount: 2, changeCount: 1 },
      { version: 1, status: 'published', publishedBy: 'Test keeper', effectiveDate: '2026-01-15', itemCount: 2, changeCount: 4 },
    ])
  })

  it('is empty before anything is published', async () => {
    expect((await admin.get('/api/price-book/versions')).body).toEqual([])
  })

  it('is not for an owner', async () => {
    expect((await app.signInAs('owner').agent.get('/api/price-book/versions')).status).toBe(403)
  })
})

describe('GET /api/price-book/versions/:version/items', () => {
  beforeEach(() => {
    addPriceBook(app.db, {
      items: [
        keyedPriceItem(),
        DOOR_ITEM,
        keyedPriceItem({
          key: 'wall/paint-two-coats',
          name: 'Paint, two coats',
          system: 'walls',
          trade: 'painting',
          note: 'Over a crème primer.',
        }),
      ],
      regionItems: [{ regionKey: 'dear', item: keyedPriceItem({ installed: { low: 1, likely: 2, high: 3 }, minimumChargeCents: 77 }) }],
    })
  })

  it('gives all items of the version at their base prices', async () => {
    const items = await itemsOf(1)
    expect(items.map(({ key }) => key)).toEqual(['wall/paint-two-coats', 'inside-door/test-door', 'floor/test-plank'])
    expect(items[2]).toEqual({ ...keyedPriceItem(), rowVersion: 1 })
  })

  it.each([
    ['pla', ['floor/test-plank']],
    ['COAT pain', ['wall/paint-two-coats']],
    ['paint floor', []],
    ['test', ['inside-door/test-door', 'floor/test-plank']],
    ['creme', ['wall/paint-two-coats']],
    ['carpentry', ['inside-door/test-door']],
    ['walls and', ['wall/paint-two-coats']],
    ['two-coats', ['wall/paint-two-coats']],
    ['  ', ['wall/paint-two-coats', 'inside-door/test-door', 'floor/test-plank']],
  ])('finds by the beginnings of all words: %s', async (search, keys) => {
    const found = await itemsOf(1, `?search=${encodeURIComponent(search)}`)
    expect(found.map(({ key }) => key).sort()).toEqual([...keys].sort())
  })

  it.each(['"', '*', 'floor" OR "door', 'name:', '(', 'NEAR(a b)', "';--"])('takes %s as plain text', async (search) => {
    expect((await admin.get('/api/price-book/versions/1/items').query({ search })).status).toBe(200)
  })

  it('puts a match in the name before one in the note', async () => {
    addPriceBook(app.db, {
      regions: [],
      items: [
        keyedPriceItem({ key: 'floor/a', name: 'A board', note: 'Like cork, but cheaper.' }),
        keyedPriceItem({ key: 'floor/b', name: 'Cork tile', note: '' }),
      ],
    })
    expect((await itemsOf(2, '?search=cork')).map(({ key }) => key)).toEqual(['floor/b', 'floor/a'])
  })

  it('keeps to a system and to a limit', async () => {
    expect((await itemsOf(1, '?system=walls')).map(({ key }) => key)).toEqual(['wall/paint-two-coats'])
    expect(await itemsOf(1, '?limit=1')).toHaveLength(1)
  })

  it("gives a region's prices: by its factors, or by its own row where it has one", async () => {
    const door = await itemOf(1, 'inside-door/test-door', '?region=dear')
    // Labor is 60 % of 300.00 and costs twice as much, materials are 40 % and cost half as much again: 300 × (0.6 × 2 + 0.4 × 1.5) = 540.
    expect(door?.installed?.likely).toBe(5_400_000)
    const plank = await itemOf(1, 'floor/test-plank', '?region=dear')
    expect(plank).toMatchObject({ isRegionsOwn: true, installed: { low: 1, likely: 2, high: 3 }, minimumChargeCents: 77 })
    expect(await itemOf(1, 'floor/test-plank', '?region=plain')).toEqual({ ...keyedPriceItem(), rowVersion: 1 })
  })

  it('answers 404 for a version or a region that there is not, 422 for what is no version', async () => {
    expect((await admin.get('/api/price-book/versions/9/items')).status).toBe(404)
    expect((await admin.get('/api/price-book/versions/1/items?region=nowhere')).status).toBe(404)
    expect((await admin.get('/api/price-book/versions/abc/items')).status).toBe(422)
    expect((await admin.get('/api/price-book/versions/1/items?system=roofs')).body).toMatchObject({
      status: 422,
      errors: [{ path: 'system' }],
    })
  })
})

describe('GET /api/price-book/versions/:version/regions', () => {
  it('gives the regions with their factors', async () => {
    addPriceBook(app.db)
    const answer = await estimator.get('/api/price-book/versions/1/regions')
    expect(answer.body).toEqual([
      { ...PLAIN_REGION, rowVersion: 1 },
      { ...DEAR_REGION, rowVersion: 1 },
    ])
  })
})

describe('POST /api/price-book/draft', () => {
  it('begins the next version and leaves an audit row and an event', async () => {
    addPriceBook(app.db)
    const heard = heardEvents(app, 'estimator')
    const answer = await admin.post('/api/price-book/draft')
    expect(answer.status).toBe(201)
    expect(answer.body).toMatchObject({ version: 2, status: 'draft', itemCount: 2, changeCount: 0 })
    expect(auditOf(app.db, 'price-book')).toMatchObject([{ whatId: '2', action: 'start' }])
    expect(heard).toEqual([{ type: 'price-book', id: '2', version: 2 }])
  })

  it('refuses a second draft with 409', async () => {
    await startDraft()
    const answer = await admin.post('/api/price-book/draft')
    expect(answer.status).toBe(409)
    expect(answer.body).toMatchObject({ code: 'draft-open' })
  })

  it('is for the admin alone', async () => {
    expect((await estimator.post('/api/price-book/draft')).status).toBe(403)
  })

  it('makes one draft of a repeat with the same Idempotency-Key', async () => {
    const first = await admin.post('/api/price-book/draft').set('Idempotency-Key', 'a')
    const again = await admin.post('/api/price-book/draft').set('Idempotency-Key', 'a')
    expect([first.status, again.status]).toEqual([201, 201])
    expect(again.body).toEqual(first.body)
  })
})

describe('DELETE /api/price-book/draft', () => {
  it('throws the draft away and leaves the published version as it was', async () => {
    addPriceBook(app.db)
    const before = await itemsOf(1)
    await startDraft()
    await admin.patch(PLANK).set('If-Match', '"1"').send({ name: 'Other plank' })
    expect((await admin.delete('/api/price-book/draft')).status).toBe(204)
    expect(await itemsOf(1)).toEqual(before)
    expect((await admin.get('/api/price-book/versions')).body).toHaveLength(1)
    expect((await admin.get('/api/price-book/versions/2/items')).status).toBe(404)
  })

  it('answers 409 when there is none', async () => {
    expect((await admin.delete('/api/price-book/draft')).body).toMatchObject({ status: 409, code: 'no-draft' })
  })
})

describe('POST /api/price-book/draft/items', () => {
  beforeEach(async () => {
    addPriceBook(app.db)
    await startDraft()
  })

  const NEW_ITEM = keyedPriceItem({ key: 'floor/test-cork', name: 'Test cork' })

  it('adds an item to the draft alone', async () => {
    const answer = await admin.post('/api/price-book/draft/items').send(NEW_ITEM)
    expect(answer.status).toBe(201)
    expect(answer.headers.etag).toBe('"1"')
    expect(answer.body).toEqual({ ...NEW_ITEM, rowVersion: 1 })
    expect(await itemOf(2, NEW_ITEM.key)).toBeDefined()
    expect(await itemOf(1, NEW_ITEM.key)).toBeUndefined()
    expect(auditOf(app.db, 'price-item')).toMatchObject([{ whatId: NEW_ITEM.key, action: 'add', after: NEW_ITEM }])
  })

  it('refuses a key that the draft has', async () => {
    const answer = await admin.post('/api/price-book/draft/items').send(keyedPriceItem())
    expect(answer.body).toMatchObject({ status: 409, code: 'key-taken' })
  })

  it('takes the key of an item that the draft drops', async () => {
    await admin.delete(PLANK).set('If-Match', '"1"')
    const answer = await admin.post('/api/price-book/draft/items').send(keyedPriceItem({ name: 'Plank anew' }))
    expect(answer.status).toBe(201)
    expect((await itemOf(2, 'floor/test-plank'))?.name).toBe('Plank anew')
    expect((await itemOf(1, 'floor/test-plank'))?.name).toBe('Test plank')
  })

  it("adds a region's own prices for an item, and refuses them for none", async () => {
    const own = keyedPriceItem({ installed: { low: 10, likely: 20, high: 30 } })
    expect((await admin.post('/api/price-book/draft/items?region=dear').send(own)).status).toBe(201)
    expect((await itemOf(2, own.key, '?region=dear'))?.installed?.likely).toBe(20)
    expect((await itemOf(2, own.key))?.installed?.likely).toBe(50_000)
    expect((await admin.post('/api/price-book/draft/items?region=nowhere').send(own)).status).toBe(404)
    const ofNothing = await admin.post('/api/price-book/draft/items?region=dear').send(NEW_ITEM)
    expect(ofNothing.body).toMatchObject({ status: 422, errors: [{ path: 'key', code: 'unknown-item' }] })
    const otherUnit = await admin
      .post('/api/price-book/draft/items?region=plain')
      .send(keyedPriceItem({ unit: 'each', roomFormula: null, houseFormula: null }))
    expect(otherUnit.body).toMatchObject({ status: 422, errors: [{ path: 'unit' }] })
  })

  it.each<[string, Record<string, unknown>, string]>([
    ['a price below zero', { materials: { low: -1, likely: 20, high: 30 } }, 'materials.low'],
    ['a price with a fifth decimal', { materials: { low: 1.5, likely: 20, high: 30 } }, 'materials.low'],
    ['low above likely', { installed: { low: 30, likely: 20, high: 40 } }, 'installed'],
    ['likely above high', { installed: { low: 10, likely: 50, high: 40 } }, 'installed'],
    ['no price at all', { materials: null, installed: null }, 'installed'],
    ['an unknown unit', { unit: 'furlong' }, 'unit'],
    ['an unknown system', { system: 'moat' }, 'system'],
    ['a code of no UNIFORMAT II form', { uniformat: 'Z9' }, 'uniformat'],
    ['a key with capitals', { key: 'Floor/X' }, 'key'],
    ['waste above the whole', { wastePercent: 101 }, 'wastePercent'],
    ['a room formula that names nothing', { roomFormula: 'florr_area' }, 'roomFormula'],
    ['a room formula of another kind', { roomFormula: 'perimeter' }, 'roomFormula'],
    ['a house formula over a room', { houseFormula: 'floor_area' }, 'houseFormula'],
    ['a formula that would run code', { houseFormula: 'import(1)' }, 'houseFormula'],
    ['a field that there is not', { colour: 'red' }, 'colour'],
  ])('refuses %s at its field', async (_, fields, path) => {
    const answer = await admin.post('/api/price-book/draft/items').send({ ...NEW_ITEM, ...fields })
    expect(answer.status).toBe(422)
    expect(answer.body.errors[0]).toMatchObject({ path, message: expect.stringMatching(/\w/) })
  })

  it('is for the admin alone', async () => {
    expect((await estimator.post('/api/price-book/draft/items').send(NEW_ITEM)).status).toBe(403)
  })
})

describe('PATCH /api/price-book/draft/items/:key', () => {
  beforeEach(() => {
    addPriceBook(app.db)
  })

  it('changes the draft and leaves the published version as it was', async () => {
    await startDraft()
    const first = await admin
      .patch(PLANK)
      .set('If-Match', '"1"')
      .send({ materials: { low: 1, likely: 2, high: 3 } })
    expect(first.status).toBe(200)
    expect(first.headers.etag).toBe('"2"')
    expect(first.body).toMatchObject({ rowVersion: 2, name: 'Test plank', materials: { low: 1, likely: 2, high: 3 } })
    const second = await admin.patch(PLANK).set('If-Match', '"2"').send({ name: 'Plank, wide' })
    expect(second.body).toMatchObject({ rowVersion: 3, name: 'Plank, wide', materials: { likely: 2 } })
    expect((await itemOf(1, 'floor/test-plank'))?.materials?.likely).toBe(20_000)
    expect(await itemsOf(2, '?search=wide')).toHaveLength(1)
    expect(await itemsOf(1, '?search=wide')).toHaveLength(0)
    expect(auditOf(app.db, 'price-item').at(-1)).toMatchObject({
      action: 'update',
      before: { name: 'Test plank' },
      after: { name: 'Plank, wide' },
    })
  })

  it('answers 412 with the item as it stands when somebody was quicker', async () => {
    await startDraft()
    await admin.patch(PLANK).set('If-Match', '"1"').send({ name: 'Quicker' })
    const answer = await admin.patch(PLANK).set('If-Match', '"1"').send({ name: 'Slower' })
    expect(answer.status).toBe(412)
    expect(answer.body.current).toMatchObject({ key: 'floor/test-plank', name: 'Quicker', rowVersion: 2 })
  })

  it('needs If-Match', async () => {
    await startDraft()
    expect((await admin.patch(PLANK).send({ name: 'X' })).status).toBe(428)
  })

  it('checks the item as it would be, not only the change', async () => {
    await startDraft()
    const answer = await admin.patch(PLANK).set('If-Match', '"1"').send({ unit: 'lf' })
    expect(answer.status).toBe(422)
    expect(answer.body.errors.map(({ path }: { path: string }) => path)).toEqual(['roomFormula', 'houseFormula'])
    const priceless = await admin.patch(PLANK).set('If-Match', '"1"').send({ installed: null, materials: null })
    expect(priceless.body).toMatchObject({ status: 422, errors: [{ path: 'installed' }] })
  })

  it("keeps the unit of an item that a region prices itself, until the region's row is dropped", async () => {
    addPriceBook(app.db, { regions: [], items: [], regionItems: [{ regionKey: 'dear', item: keyedPriceItem() }] })
    await startDraft()
    const toEach = () => admin.patch(PLANK).set('If-Match', '"1"').send({ unit: 'each', roomFormula: null, houseFormula: null })
    expect((await toEach()).body).toMatchObject({ status: 422, errors: [{ path: 'unit', code: 'regions-own' }] })
    expect((await admin.delete(`${PLANK}?region=dear`).set('If-Match', '"1"')).status).toBe(204)
    expect((await toEach()).body).toMatchObject({ unit: 'each' })
  })

  it('never changes a key', async () => {
    await startDraft()
    const answer = await admin.patch(PLANK).set('If-Match', '"1"').send({ key: 'floor/other' })
    expect(answer.body).toMatchObject({ status: 422, errors: [{ path: 'key' }] })
  })

  it('answers 404 for an unknown item and 409 without a draft', async () => {
    expect((await admin.patch(PLANK).set('If-Match', '"1"').send({ name: 'X' })).body).toMatchObject({ status: 409, code: 'no-draft' })
    await startDraft()
    expect((await admin.patch('/api/price-book/draft/items/floor/none').set('If-Match', '"1"').send({ name: 'X' })).status).toBe(404)
  })
})

describe('DELETE /api/price-book/draft/items/:key', () => {
  beforeEach(async () => {
    addPriceBook(app.db, { regionItems: [{ regionKey: 'dear', item: keyedPriceItem() }] })
    await startDraft()
  })

  it("ends the item with the draft's version and not before", async () => {
    expect((await admin.delete(PLANK).set('If-Match', '"1"')).status).toBe(204)
    expect(await itemOf(2, 'floor/test-plank')).toBeUndefined()
    expect(await itemOf(1, 'floor/test-plank')).toBeDefined()
    await publish()
    expect(await itemOf(2, 'floor/test-plank')).toBeUndefined()
    expect(await itemOf(2, 'floor/test-plank', '?region=dear')).toBeUndefined()
    expect(await itemOf(1, 'floor/test-plank', '?region=dear')).toBeDefined()
    expect((await admin.get('/api/price-book/versions')).body[0]).toMatchObject({ itemCount: 1, changeCount: 2 })
  })

  it('takes an item away without a trace that only the draft had', async () => {
    await admin.post('/api/price-book/draft/items').send(keyedPriceItem({ key: 'floor/brief' }))
    expect((await admin.delete('/api/price-book/draft/items/floor/brief').set('If-Match', '"1"')).status).toBe(204)
    expect((await admin.get('/api/price-book/versions')).body[0]).toMatchObject({ changeCount: 0 })
  })

  it('needs If-Match, and the newest', async () => {
    expect((await admin.delete(PLANK)).status).toBe(428)
    expect((await admin.delete(PLANK).set('If-Match', '"7"')).status).toBe(412)
  })

  it('answers 404 for an item that is dropped already', async () => {
    await admin.delete(PLANK).set('If-Match', '"1"')
    expect((await admin.delete(PLANK).set('If-Match', '"2"')).status).toBe(404)
  })
})

describe('PATCH /api/price-book/draft/regions/:key', () => {
  beforeEach(async () => {
    addPriceBook(app.db)
    await startDraft()
  })

  const change = (version: string, patch: object) => admin.patch('/api/price-book/draft/regions/dear').set('If-Match', version).send(patch)

  it('changes the draft alone, and prices follow', async () => {
    const answer = await change('"1"', { laborFactor: 3 })
    expect(answer.body).toEqual({ ...DEAR_REGION, laborFactor: 3, rowVersion: 2 })
    expect((await change('"2"', { salesTaxPercent: 7 })).body).toMatchObject({ laborFactor: 3, salesTaxPercent: 7, rowVersion: 3 })
    const installed = async (version: number) => (await itemOf(version, 'inside-door/test-door', '?region=dear'))?.installed?.likely
    expect(await installed(1)).toBe(5_400_000)
    expect(await installed(2)).toBe(7_200_000)
    await publish()
    expect(await installed(1)).toBe(5_400_000)
    expect(await installed(2)).toBe(7_200_000)
  })

  it('answers 412 to a stale and 428 to a missing If-Match, 404 for no region, 422 for a factor out of bounds', async () => {
    await change('"1"', { laborFactor: 3 })
    expect((await change('"1"', { laborFactor: 4 })).body).toMatchObject({ status: 412, current: { laborFactor: 3, rowVersion: 2 } })
    expect((await admin.patch('/api/price-book/draft/regions/dear').send({ laborFactor: 1 })).status).toBe(428)
    expect((await admin.patch('/api/price-book/draft/regions/none').set('If-Match', '"1"').send({})).status).toBe(404)
    expect((await change('"2"', { laborFactor: 0 })).body).toMatchObject({ status: 422, errors: [{ path: 'laborFactor' }] })
  })
})

describe('POST /api/price-book/draft/publish', () => {
  beforeEach(() => {
    addPriceBook(app.db)
  })

  it('makes the draft the newest version and leaves the older ones as they were', async () => {
    const before = await itemsOf(1)
    await startDraft()
    await admin
      .patch(PLANK)
      .set('If-Match', '"1"')
      .send({ materials: { low: 1, likely: 2, high: 3 } })
    const drafted = await itemsOf(2)
    const heard = heardEvents(app, 'estimator')

    const answer = await admin.post('/api/price-book/draft/publish').send({ note: 'Spring prices', effectiveDate: '2026-04-01' })

    expect(answer.body).toMatchObject({
      version: 2,
      status: 'published',
      note: 'Spring prices',
      effectiveDate: '2026-04-01',
      changeCount: 1,
    })
    expect(await itemsOf(2)).toEqual(drafted)
    expect(await itemsOf(1)).toEqual(before)
    expect(auditOf(app.db, 'price-book').at(-1)).toMatchObject({ action: 'publish', after: { version: 2 } })
    expect(heard).toEqual([{ type: 'price-book', id: '2', version: 2 }])
  })

  it('refuses an empty draft, no draft and a second go with 409', async () => {
    const send = () => admin.post('/api/price-book/draft/publish').send({ note: 'x', effectiveDate: '2026-04-01' })
    expect((await send()).body).toMatchObject({ status: 409, code: 'no-draft' })
    await startDraft()
    expect((await send()).body).toMatchObject({ status: 409, code: 'empty-draft' })
    await admin.patch(PLANK).set('If-Match', '"1"').send({ name: 'X' })
    expect((await send()).status).toBe(200)
    expect((await send()).body).toMatchObject({ status: 409, code: 'no-draft' })
  })

  it('asks for a note and a date', async () => {
    await startDraft()
    const answer = await admin.post('/api/price-book/draft/publish').send({ note: ' ', effectiveDate: 'soon' })
    expect(answer.status).toBe(422)
    expect(answer.body.errors.map(({ path }: { path: string }) => path)).toEqual(['note', 'effectiveDate'])
  })
})

describe('a published version', () => {
  beforeEach(() => {
    addPriceBook(app.db)
  })

  it.each<[string, () => unknown]>([
    ['an update of its items', () => app.db.update(priceItems).set({ name: 'Forged' }).run()],
    ['an end before a version that is out', () => app.db.update(priceItems).set({ untilVersion: 1 }).run()],
    ['a deletion of its items', () => app.db.delete(priceItems).run()],
    ['a new item in it', () => app.db.update(priceItems).set({ fromVersion: 1, key: 'new' }).run()],
    ['an update of its regions', () => app.db.update(priceRegions).set({ laborFactor: 4 }).run()],
    ['a deletion of its regions', () => app.db.delete(priceRegions).run()],
    ['an update of itself', () => app.db.update(priceBookVersions).set({ status: 'draft' }).run()],
    ['a deletion of itself', () => app.db.delete(priceBookVersions).run()],
  ])('is kept by the database itself from %s', (_, forge) => {
    expect(forge).toThrow(/published/)
  })

  it('takes no row more', () => {
    const [row] = app.db.select().from(priceItems).all()
    expect(() =>
      app.db
        .insert(priceItems)
        .values({ ...row!, id: undefined, key: 'floor/late' })
        .run(),
    ).toThrow(/published/)
  })

  it('is read by one range of the index', async () => {
    const plans = await queryPlans(app.db, '"price_items"', () => itemsOf(1))
    expect(plans).toEqual([
      'SEARCH price_items USING INDEX price_items_version (region_key=? AND from_version<?)',
      'USE TEMP B-TREE FOR ORDER BY',
    ])
  })
})
