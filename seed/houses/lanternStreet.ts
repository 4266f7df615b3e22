import type { DemoHouse } from './demoHouse.ts'
import { lanternStreetLines } from './lanternStreetLines.ts'
import { builtIn, cabinets, cased, door, ell, flat, outside, polygon, rectangle, room, sloped, tub, window } from './roomParts.ts'

/** A brick-and-frame bungalow of 1926 with a cellar and old textured ceilings: nearly every system needs something. */
export const lanternStreet: DemoHouse = {
  key: 'lantern-street',
  walkedOn: '2026-05-12',
  isShared: true,
  house: {
    name: '14 Lantern Street',
    address: '14 Lantern Street, Merrow Mills, Merrow Valley',
    regionKey: 'merrow-valley',
    yearBuilt: 1926,
    storeys: 1,
    kind: 'detached',
    footprint: rectangle(`42'`, `28'`),
    wallHeightIn: outside(`9' 4"`),
    overhangIn: outside(`12"`),
    roof: [{ kind: 'gable', rise: 8 }],
    note: 'Demo: all invented. Brick to the eave, frame gables. Textured ceilings in the living room and the dining room, left undisturbed until tested.',
  },
  rooms: [
    room('living', 'Living room', 'living', rectangle(`18' 4"`, `13' 6"`), flat(`8' 6"`), {
      openings: [door(`3'`, `6' 8"`), cased(`6'`, `7'`), cased(`3'`, `7'`), window(`3'`, `5'`, 3)],
      deductions: [builtIn(`5' 6"`, `4' 8"`, `1' 4"`)],
      note: 'Brick fireplace, not used. Textured ceiling.',
    }),
    room(
      'dining',
      'Dining room',
      'dining',
      polygon(
        ['0', '0'],
        [`13'`, '0'],
        [`13'`, `11' 6"`],
        [`9' 6"`, `11' 6"`],
        [`8' 6"`, `13' 6"`],
        [`4' 6"`, `13' 6"`],
        [`3' 6"`, `11' 6"`],
        ['0', `11' 6"`],
      ),
      flat(`8' 6"`),
      { openings: [cased(`6'`, `7'`), door(`2' 8"`, `6' 8"`), window(`2' 4"`, `5'`, 3)], note: 'Bay of three windows. Textured ceiling.' },
    ),
    room('kitchen', 'Kitchen', 'kitchen', ell(`13-2`, `11-6`, `3-0`, `4-0`), flat(`8' 6"`), {
      openings: [door(`2' 8"`, `6' 8"`, 3), window(`2' 8"`, `3' 6"`, 2)],
      deductions: [cabinets(`14'`, `3'`, `2'`)],
      note: 'The pantry takes a corner. Old resilient floor under two later ones.',
    }),
    room('hall', 'Hall', 'hall', rectangle(`14'`, `3' 8"`), flat(`8' 6"`), {
      openings: [door(`2' 6"`, `6' 8"`, 5), cased(`3'`, `7'`)],
    }),
    room('front-bedroom', 'Front bedroom', 'sleeping', rectangle(`12' 6"`, `10'`), flat(`8' 6"`), {
      openings: [door(`2' 6"`, `6' 8"`), door(`2'`, `6' 8"`), window(`3'`, `5'`, 2)],
    }),
    room('middle-bedroom', 'Middle bedroom', 'sleeping', ell(`11' 8"`, `10' 4"`, `2'`, `1' 8"`), flat(`8' 6"`), {
      openings: [door(`2' 6"`, `6' 8"`), door(`2'`, `6' 8"`), window(`2' 4"`, `4' 6"`)],
      note: 'The chimney takes a corner.',
    }),
    room('back-bedroom', 'Back bedroom', 'sleeping', rectangle('12.5', '3.35 m'), flat(`8' 6"`), {
      openings: [door(`2' 6"`, `6' 8"`), door(`2'`, `6' 8"`), window(`3'`, `5'`, 2)],
    }),
    room('bath', 'Bath', 'bath', rectangle(`8' 2"`, `5' 6"`), flat(`8' 6"`), {
      openings: [door(`2' 4"`, `6' 8"`), window(`2'`, `3'`)],
      deductions: [tub(`5'`, `1' 4"`, `2' 6"`)],
    }),
    room('attic-room', 'Attic room', 'attic', rectangle(`22'`, `12'`), sloped(`4' 2"`, `7' 8"`), {
      openings: [door(`2' 4"`, `6'`), window(`2' 4"`, `3'`, 2)],
      note: 'Under the roof; part of it is too low to count as living area.',
    }),
    room('cellar', 'Cellar', 'cellar', rectangle(`40'`, `26'`), flat(`6' 8"`), {
      openings: [door(`2' 8"`, `6' 6"`), window(`2' 8"`, `1' 4"`, 4)],
      note: 'Stone to grade, brick above. Damp along the north wall.',
    }),
  ],
  lines: lanternStreetLines,
  settings: {
    overheadAndProfitPercent: 20,
    permitsCents: 98_000,
    contingency: { method: 'percent', percent: 10 },
  },
  unknowns: [
    {
      key: 'ceiling-fiber',
      description: 'Textured ceilings hold asbestos: enclosed by a licensed firm in place of scraping',
      system: 'ceilings',
      chance: 0.6,
      cost: { low: '1800', likely: '3400', high: '6500' },
    },
    {
      key: 'tub-rot',
      description: 'Rot under the tub reaches the joists',
      system: 'floor-structure',
      chance: 0.45,
      cost: { low: '900', likely: '2200', high: '4800' },
    },
    {
      key: 'lateral',
      description: 'Sewer lateral of clay has failed',
      system: 'sewer',
      chance: 0.35,
      cost: { low: '4500', likely: '9500', high: '18000' },
    },
    {
      key: 'north-wall',
      description: 'North-east corner still moving',
      system: 'foundation',
      chance: 0.2,
      cost: { low: '6000', likely: '12000', high: '22000' },
    },
    {
      key: 'old-wiring',
      description: 'Open wiring in more of the walls than seen',
      system: 'electrical',
      chance: 0.5,
      cost: { low: '1500', likely: '4200', high: '9000' },
    },
  ],
  inspections: [
    {
      key: 'fiber-samples',
      description: 'Laboratory samples of ceilings, floor and pipe wrap',
      cost: '570.00',
      settles: ['ceiling-fiber'],
    },
    { key: 'moisture-readings', description: 'Moisture readings at the tub, from above and below', cost: '180.00', settles: ['tub-rot'] },
    { key: 'sewer-camera', description: 'Camera through the lateral', cost: '320.00', settles: ['lateral'] },
    { key: 'engineer-visit', description: 'Structural engineer’s visit and letter', cost: '650.00', settles: ['north-wall'] },
    { key: 'wiring-trace', description: 'Electrician traces the old wiring', cost: '290.00', settles: ['old-wiring'] },
  ],
}
