import type { DemoHouse } from './demoHouse.ts'
import { ropewalkLines } from './ropewalkLines.ts'
import { cabinets, cased, door, flat, outside, rectangle, room, tub, window } from './roomParts.ts'

/** A row house of 1978 that needs freshening: mostly own hands, few trades, one bad spot under the tub. */
export const ropewalk: DemoHouse = {
  key: 'ropewalk',
  walkedOn: '2026-06-03',
  isShared: true,
  house: {
    name: '88 Ropewalk',
    address: '88 Ropewalk, Merrow Quay, Merrow Harbor',
    regionKey: 'merrow-harbor',
    yearBuilt: 1978,
    storeys: 2,
    kind: 'row',
    footprint: rectangle(`34'`, `18'`),
    wallHeightIn: outside(`8' 9"`),
    overhangIn: 0,
    roof: [{ kind: 'flat', rise: 0 }],
    note: 'Demo: all invented. Party walls both sides, brick front and back, flat roof behind a parapet.',
  },
  rooms: [
    room('living', 'Living and dining room', 'living', rectangle(`20' 6"`, `16' 8"`), flat(`8'`), {
      openings: [door(`3'`, `6' 8"`), cased(`4'`, `7'`), door(`2' 6"`, `6' 8"`), window(`3'`, `4' 6"`, 2)],
    }),
    room('kitchen', 'Kitchen', 'kitchen', rectangle(`12'`, `10' 4"`), flat(`8'`), {
      openings: [cased(`4'`, `7'`), door(`2' 8"`, `6' 8"`), window(`3'`, `3' 6"`)],
      deductions: [cabinets(`15'`, `3'`, `2'`)],
    }),
    room('half-bath', 'Half bath', 'bath', rectangle(`5'`, `4' 2"`), flat(`8'`), { openings: [door(`2' 4"`, `6' 8"`)] }),
    room('front-bedroom', 'Front bedroom', 'sleeping', rectangle(`16' 8"`, `12' 3"`), flat(`8'`), {
      openings: [door(`2' 6"`, `6' 8"`), door(`5'`, `6' 8"`), window(`3'`, `4' 6"`, 2)],
    }),
    room('back-bedroom', 'Back bedroom', 'sleeping', rectangle(`13'`, `10' 6"`), flat(`8'`), {
      openings: [door(`2' 6"`, `6' 8"`), door(`4'`, `6' 8"`), window(`3'`, `4' 6"`)],
    }),
    room('upper-hall', 'Stair and upper hall', 'hall', rectangle(`12' 2"`, `6' 6"`), flat(`8'`), { openings: [door(`2' 6"`, `6' 8"`, 3)] }),
    room('bath', 'Bath', 'bath', rectangle(`8' 4"`, `5' 2"`), flat(`8'`), {
      openings: [door(`2' 4"`, `6' 8"`)],
      deductions: [tub(`5'`, `1' 4"`, `2' 6"`)],
    }),
  ],
  lines: ropewalkLines,
  settings: {
    overheadAndProfitPercent: 0,
    permitsCents: 0,
    contingency: { method: 'fixed', amountCents: 450_000 },
  },
  unknowns: [
    {
      key: 'tub-rot',
      description: 'Rot below the tub reaches the ceiling of the kitchen',
      system: 'floor-structure',
      chance: 0.4,
      cost: { low: '800', likely: '1900', high: '4000' },
    },
    {
      key: 'flat-roof',
      description: 'Wet insulation below the roof: new membrane in place of the coating',
      system: 'roof',
      chance: 0.3,
      cost: { low: '5200', likely: '7400', high: '10500' },
    },
  ],
  inspections: [
    { key: 'moisture-readings', description: 'Moisture readings at the tub and the ceiling below', cost: '180.00', settles: ['tub-rot'] },
    { key: 'roof-inspection', description: 'Roof inspection with a core', cost: '260.00', settles: ['flat-roof'] },
  ],
}
