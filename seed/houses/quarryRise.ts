import type { DemoHouse } from './demoHouse.ts'
import { quarryRiseLines } from './quarryRiseLines.ts'
import { cabinets, cased, door, ell, flat, outside, polygon, rectangle, room, sloped, tub, window } from './roomParts.ts'

/** A split-level of 1963 with a wing of 1968: sound, but tired, with a crawl space, old windows and aluminum branch wiring. */
export const quarryRise: DemoHouse = {
  key: 'quarry-rise',
  walkedOn: '2026-05-27',
  isShared: false,
  house: {
    name: '5 Quarry Rise',
    address: '5 Quarry Rise, Upper Merrow, Merrow Uplands',
    regionKey: 'merrow-uplands',
    yearBuilt: 1963,
    storeys: 1.5,
    kind: 'split-level',
    footprint: ell(`52'`, `28'`, `22'`, `4'`),
    wallHeightIn: outside(`8' 2"`),
    overhangIn: outside(`24"`),
    roof: [{ kind: 'hip', rise: 4 }],
    note: 'Demo: all invented. Three levels, half a stair apart; the family room wing was added in 1968.',
  },
  rooms: [
    room('living', 'Living room', 'living', rectangle(`21'`, `14' 6"`), sloped(`8'`, `11' 4"`), {
      openings: [door(`3'`, `6' 8"`), cased(`5'`, `7'`), window(`8'`, `5'`), window(`3'`, `4'`)],
      note: 'Ceiling follows the roof.',
    }),
    room('kitchen', 'Kitchen and dining', 'kitchen', ell(`19' 6"`, `13'`, `6' 6"`, `3'`), flat(`8'`), {
      openings: [cased(`5'`, `7'`), door(`6'`, `6' 8"`), window(`4'`, `3'`)],
      deductions: [cabinets(`12'`, `3'`, `2'`)],
    }),
    room(
      'upper-hall',
      'Upper hall and stair',
      'hall',
      polygon(['0', '0'], [`13'`, '0'], [`13'`, `3' 6"`], [`4' 6"`, `3' 6"`], [`4' 6"`, `9' 3"`], ['0', `9' 3"`]),
      flat(`8'`),
      {
        openings: [door(`2' 6"`, `6' 8"`, 4)],
      },
    ),
    room('bed-1', 'Bedroom 1', 'sleeping', rectangle(`14' 2"`, `12'`), flat(`8'`), {
      openings: [door(`2' 6"`, `6' 8"`), door(`5'`, `6' 8"`), window(`4'`, `4'`, 2)],
    }),
    room('bed-2', 'Bedroom 2', 'sleeping', rectangle(`12' 3"`, `10' 8"`), flat(`8'`), {
      openings: [door(`2' 6"`, `6' 8"`), door(`4'`, `6' 8"`), window(`4'`, `4'`)],
    }),
    room('bed-3', 'Bedroom 3', 'sleeping', rectangle(`10' 8"`, `9' 10 1/2"`), flat(`8'`), {
      openings: [door(`2' 6"`, `6' 8"`), door(`4'`, `6' 8"`), window(`4'`, `2' 6"`)],
      note: 'High window over the stair roof.',
    }),
    room('bath', 'Upper bath', 'bath', rectangle(`8'`, `7' 4"`), flat(`8'`), {
      openings: [door(`2' 4"`, `6' 8"`), window(`2'`, `2'`)],
      deductions: [tub(`5'`, `1' 4"`, `2' 6"`)],
    }),
    room('half-bath', 'Half bath', 'bath', rectangle(`5' 4"`, `4' 6"`), flat(`7' 6"`), { openings: [door(`2' 4"`, `6' 8"`)] }),
    room('family-room', 'Family room', 'living', rectangle(`21' 6"`, `13' 8"`), flat(`7' 6"`), {
      openings: [door(`2' 8"`, `6' 8"`, 2), window(`5'`, `4'`)],
      note: 'Wing of 1968. Nine-inch floor tile below the carpet edge: left undisturbed.',
    }),
    room('laundry', 'Laundry', 'laundry', rectangle(`9'`, `6' 3"`), flat(`7' 6"`), { openings: [door(`2' 8"`, `6' 8"`, 2)] }),
    room('garage', 'Garage', 'storage', rectangle(`22'`, `12' 4"`), flat(`8'`), {
      openings: [door(`9'`, `7'`), door(`2' 8"`, `6' 8"`, 2), window(`3'`, `2'`)],
    }),
  ],
  lines: quarryRiseLines,
  settings: {
    overheadAndProfitPercent: 0,
    permitsCents: 65_000,
    contingency: { method: 'percent', percent: 15 },
  },
  unknowns: [
    {
      key: 'aluminum-extent',
      description: 'Aluminum wiring beyond the wing of 1968',
      system: 'electrical',
      chance: 0.3,
      cost: { low: '1200', likely: '2800', high: '5200' },
    },
    {
      key: 'second-layer',
      description: 'A second roof layer below: strip in place of laying over',
      system: 'roof',
      chance: 0.25,
      cost: { low: '1900', likely: '3200', high: '4900' },
    },
    {
      key: 'growth-below',
      description: 'Suspected growth on the crawl space framing',
      system: 'crawl-space',
      chance: 0.35,
      cost: { low: '1500', likely: '3600', high: '8000' },
    },
    {
      key: 'floor-tile',
      description: 'Floor tile of the wing breaks up and must be abated',
      system: 'floors',
      chance: 0.1,
      cost: { low: '1800', likely: '2600', high: '4200' },
    },
  ],
  inspections: [
    { key: 'electrician', description: 'Electrician opens a sample of boxes', cost: '290.00', settles: ['aluminum-extent'] },
    { key: 'roof-inspection', description: 'Roof inspection with a cut at the rake', cost: '230.00', settles: ['second-layer'] },
    { key: 'growth-samples', description: 'Samples of suspected growth, two', cost: '580.00', settles: ['growth-below'] },
  ],
}
