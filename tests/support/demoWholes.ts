import { seedDemo } from '../../seed/index.ts'
import { demoHouses } from '../../seed/houses/index.ts'
import { migrate } from '../../server/db/migrate.ts'
import { openDatabase } from '../../server/db/openDatabase.ts'
import { prepareEstimateWhole } from '../../server/features/estimates/estimateWholeQuery.ts'
import { estimateWholeSchema, type EstimateWhole } from '../../shared/schemas/estimate.ts'

let read: Promise<EstimateWhole[]> | undefined

/** The estimates of the demo's houses as the server reads them, from a freshly seeded database. Read once: change copies. */
export function demoWholes(): Promise<EstimateWhole[]> {
  read ??= readDemoWholes()
  return read
}

async function readDemoWholes(): Promise<EstimateWhole[]> {
  const db = openDatabase(':memory:')
  migrate(db)
  await seedDemo(db)
  const readWhole = prepareEstimateWhole(db)
  const wholes = demoHouses.map(({ key }) => estimateWholeSchema.parse(JSON.parse(readWhole(`${key}-estimate`) ?? 'null')))
  db.$client.close()
  return wholes
}
