import type { DemoHouse } from './demoHouse.ts'
import { lanternStreet } from './lanternStreet.ts'
import { quarryRise } from './quarryRise.ts'
import { ropewalk } from './ropewalk.ts'

/** The demo's three houses, as one would really estimate them. All invented. */
export const demoHouses: readonly DemoHouse[] = [lanternStreet, quarryRise, ropewalk]
