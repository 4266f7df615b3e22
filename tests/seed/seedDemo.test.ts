import { beforeAll, describe, expect, it } from 'vitest'
import { compareSync } from 'bcryptjs'
import { demoAccounts } from '../../seed/demoAccounts.ts'
import { demoHouses } from '../../seed/houses/index.ts'
import { DEMO_FIRM, seedDemo } from '../../seed/index.ts'
import type { Database } from '../../server/db/client.ts'
import { migrate } from '../../server/db/migrate.ts'
import { openDatabase } from '../../server/db/openDatabase.ts'
import { auditEntries } from '../../server/db/schema/auditEntries.ts'
import { users } from '../../server/db/schema/users.ts'
import { findPersonByEmail, listPeople } from '../../server/features/accounts/personRepository.ts'
import { prepareEstimateWhole } from '../../server/features/estimates/estimateWholeQuery.ts'
import { findFirm, saveFirm } from '../../server/features/firm/firmRepository.ts'
import { findHouseSummaries } from '../../server/features/houses/houseRepository.ts'
import { findVersions } from '../../server/features/price-book/priceBookVersionRepository.ts'
import { HOUSE_SYSTEMS } from '../../shared/catalogue/houseSystems.ts'
import { computeEstimate, readEstimateDocument, toEstimateInput, writeEstimateDocument } from '../../shared/engine/index.ts'
import { estimateWholeSchema, type EstimateWhole } from '../../shared/schemas/estimate.ts'

function emptyDatabase(): Database {
  const db = openDatabase(':memory:')
  migrate(db)
  return db
}

describe('seedDemo', () => {
  let db: Database
  let wholes: EstimateWhole[]

  beforeAll(async () => {
    db = emptyDatabase()
    await seedDemo(db)
    const readWhole = prepareEstimateWhole(db)
    wholes = demoHouses.map(({ key }) => estimateWholeSchema.parse(JSON.parse(readWhole(`${key}-estimate`) ?? 'null')))
  })

  describe('into an empty database', () => {
    it('marks the firm as a demo', () => {
      expect(findFirm(db)).toEqual({ name: DEMO_FIRM, isDemo: true })
    })

    it('adds the three people that it prints, and others beside them', () => {
      const known = demoAccounts.map(({ email }) => findPersonByEmail(db, email))
      expect(known.map((one) => one?.person.role)).toEqual(['admin', 'estimator', 'owner'])
      expect(known.every((one) => one?.person.status === 'active')).toBe(true)
      // One password and one hash for all, so that the first start stays quick.
      expect(new Set(known.map((one) => one?.passwordHash)).size).toBe(1)
      expect(new Set(demoAccounts.map(({ password }) => password)).size).toBe(1)
      expect(compareSync(demoAccounts[0]?.password ?? '', known[0]?.passwordHash ?? '')).toBe(true)
      const people = listPeople(db)
      expect(people.length).toBeGreaterThan(demoAccounts.length)
      expect(people.every(({ email }) => email.endsWith('.example'))).toBe(true)
    })

    it('publishes version 1 of the price book, and leaves no draft', () => {
      expect(findVersions(db)).toMatchObject([{ version: 1, status: 'published' }])
      expect(findVersions(db)[0]?.itemCount).toBeGreaterThanOrEqual(320)
    })

    it('shares two of the houses with the owner, and none with the other owner', () => {
      const namesFor = (owner: string) => findHouseSummaries(db, owner).map(({ name }) => name)
      expect(namesFor('demo-owner').sort()).toEqual(['14 Lantern Street', '88 Ropewalk'])
      expect(namesFor('demo-second-owner')).toEqual([])
      expect(findHouseSummaries(db, null)).toHaveLength(3)
    })

    it('leaves an audit row', () => {
      expect(db.select().from(auditEntries).all()).toMatchObject([{ what: 'firm', action: 'seed-demo' }])
    })
  })

  describe.each(demoHouses.map(({ key }, index) => ({ key, index })))('the estimate of $key', ({ index }) => {
    const whole = () => wholes[index] as EstimateWhole

    it('holds 30 to 120 lines, none with an error', () => {
      expect(whole().lines.length).toBeGreaterThanOrEqual(30)
      expect(whole().lines.length).toBeLessThanOrEqual(120)
      expect(computeEstimate(toEstimateInput(whole())).errors).toEqual([])
      expect(whole().estimate.errorCount).toBe(0)
    })

    it('keeps the totals that the engine gives', () => {
      expect(whole().estimate.totals).toEqual(computeEstimate(toEstimateInput(whole())).totals)
      expect(whole().estimate.totals.totalCents.likely).toBeGreaterThan(1_000_000)
    })

    it('has own hands and hired work, and several marks of evidence', () => {
      expect(new Set(whole().lines.map(({ basis }) => basis)).size).toBe(2)
      expect(new Set(whole().lines.map(({ evidence }) => evidence)).size).toBeGreaterThanOrEqual(2)
    })

    it('takes each line at the prices of its region', () => {
      for (const { basis, book, override, description } of whole().lines) {
        const isPriced = override !== null || (basis === 'hired' ? book.installed : book.materials) !== null
        expect(isPriced, description).toBe(true)
      }
    })

    it('keeps unknowns and inspections that an estimate document may hold, each inspection settling an unknown that is there', () => {
      const read = readEstimateDocument(writeEstimateDocument(whole()))
      if (!read.ok) expect.fail(JSON.stringify(read.errors))
      const { unknowns = [], inspections = [] } = read.document
      const keys = unknowns.map(({ key }) => key)
      expect(keys.length).toBeGreaterThan(0)
      expect(inspections.length).toBeGreaterThan(0)
      for (const key of inspections.flatMap(({ settles }) => settles)) expect(keys).toContain(key)
    })
  })

  it('shows the range of the tool: an ell, a polygon, a sloped ceiling, deductions, both ways of contingency', () => {
    const rooms = wholes.flatMap((whole) => whole.rooms)
    expect(new Set(rooms.map(({ shape }) => shape.kind))).toEqual(new Set(['rectangle', 'ell', 'polygon']))
    expect(new Set(rooms.map(({ ceiling }) => ceiling?.kind))).toContain('sloped')
    expect(rooms.some(({ deductions }) => deductions.length > 0)).toBe(true)
    expect(new Set(wholes.map(({ estimate }) => estimate.settings.contingency.method))).toEqual(new Set(['percent', 'fixed']))
  })

  it('has work for every house system in the bungalow', () => {
    const systems = new Set(wholes[0]?.lines.map(({ system }) => system))
    expect(HOUSE_SYSTEMS.map(({ key }) => key).filter((key) => !systems.has(key))).toEqual([])
  })

  describe('into a database that is in use', () => {
    it('leaves a demo as it stands, with what was tried in it', async () => {
      db.update(users).set({ name: 'Changed in the demo' }).run()
      await expect(seedDemo(db)).resolves.toBe('already-seeded')
      expect(findVersions(db)).toHaveLength(1)
      expect(listPeople(db).every(({ name }) => name === 'Changed in the demo')).toBe(true)
    })

    it('refuses another firm’s, names it, and writes nothing', async () => {
      const theirs = emptyDatabase()
      saveFirm(theirs, { name: 'Somebody Else House Advisers', isDemo: false })
      await expect(seedDemo(theirs)).rejects.toThrow(/Somebody Else House Advisers/)
      expect(listPeople(theirs)).toEqual([])
    })

    it('refuses one that has accounts but no firm yet', async () => {
      const theirs = emptyDatabase()
      const at = '2026-01-01T00:00:00.000Z'
      theirs
        .insert(users)
        .values({ id: 'a', email: 'a@b.example', name: 'A', role: 'admin', status: 'active', createdAt: at, updatedAt: at })
        .run()
      await expect(seedDemo(theirs)).rejects.toThrow(/accounts/)
      expect(findFirm(theirs)).toBeNull()
    })
  })
})
