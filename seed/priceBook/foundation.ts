import { priceTable } from './priceTable.ts'

/** Foundation. */
export const foundationItems = priceTable(
  { system: 'foundation', trade: 'masonry', priceDate: '2026-03-10' },
  `
  key                           | name                                 | unit | uniformat | own hands   | hired          | labor % | waste % | package  | minimum | hours | room formula     | house formula
  foundation/crack-inject       | Wall crack injected                  | lf   | A2020     | 9 14 22     | 48 70 105      | 68      | 0       |          | 450     | 0.6   |                  | 8
    Epoxy or foam, from inside, on a crack that an engineer calls still.
  foundation/crack-seal         | Wall crack routed and sealed         | lf   | A2020     | 2 3.2 5     | 14 21 32       | 80      | 0       |          | 250     | 0.35  |                  | 12
    Hydraulic cement and a flexible coat.
  foundation/crack-monitor      | Crack gauge set and read             | each | A2020     | 18 28 42    | 90 140 220     | 80      | 0       |          | 120     | 0.8   |                  | 3
    Dated gauge, photographed, read again in the spring.
  foundation/repoint-inside     | Stone or brick wall repointed inside | sf   | A2020     | 0.9 1.4 2.2 | 8 12 18        | 88      | 0       |          | 600     | 0.4   |                  | 150
    Loose lime mortar raked and refilled with lime mortar.
  foundation/parge              | Wall parged                          | sf   | A2020     | 0.7 1 1.5   | 4.5 6.5 9.5    | 82      | 5       |          | 450     | 0.12  |                  | 120
    Two thin coats on a damped wall.
  foundation/pier               | Pier driven to bearing, with bracket | each | A1020     |             | 1500 2000 2900 | 52      | 0       |          | 4500    | 0     |                  | 6
    Engineer's layout; lift only as far as the engineer says.
  foundation/wall-strap         | Carbon strap on a bowing wall        | each | A2020     |             | 480 680 980    | 55      | 0       |          | 1500    | 0     |                  | 5
    Where the engineer finds the bow small enough.
  foundation/wall-beam          | Steel beam against a bowing wall     | each | A2020     |             | 750 1050 1500  | 50      | 0       |          | 1800    | 0     |                  | 5
    Footed below, bracketed to the joists above.
  foundation/wall-rebuild       | Block wall rebuilt, shored           | lf   | A2020     |             | 260 370 540    | 66      | 0       |          | 4500    | 0     |                  | 16
    Shored, dug, relaid, drained and coated, by the engineer's drawing.
  foundation/waterproof-outside | Wall waterproofed from outside       | lf   | A2020     |             | 120 175 260    | 66      | 0       |          | 3500    | 0     |                  | outside_perimeter * 0.5
    Dug to the footing, coated, drain and stone, backfilled.
  foundation/footing-pad        | Concrete pad footing                 | each | A1010     | 35 55 85    | 260 390 580    | 74      | 0       |          | 400     | 5     |                  | 3
    Two feet square, a foot deep, below a post.
  foundation/floor-post         | Steel floor post, permanent          | each | A1010     | 70 105 160  | 260 380 570    | 60      | 0       |          | 350     | 3     |                  | 3
    Fixed post with plates on a sound footing.
  foundation/slab-patch         | Cellar slab patched                  | sf   | A1030     | 1.4 2 3     | 8 12 18        | 76      | 10      |          | 450     | 0.2   | floor_area * 0.1 | 40
    Broken out, gravel, four inches of concrete.
  foundation/sill-plate         | Sill plate replaced                  | lf   | B1010     | 6 9 14      | 48 72 110      | 78      | 10      | 16 stick | 900     | 1.4   |                  | outside_perimeter * 0.1
    Wall jacked an eighth, treated sill, sealed, termite shield.
  foundation/chimney-base       | Chimney base repaired in the cellar  | each | A1010     |             | 450 750 1250   | 80      | 0       |          | 450     | 0     |                  | 1
    Loose brick relaid, ash door closed.
  `,
)

/** Crawl space, cellar, basement. */
export const crawlSpaceItems = priceTable(
  { system: 'crawl-space', trade: 'general', priceDate: '2026-03-17' },
  `
  key                      | name                           | unit | uniformat | own hands      | hired          | labor % | waste % | package    | minimum | hours | room formula | house formula
  crawl-space/ground-sheet | Ground sheet, taped            | sf   | A2020     | 0.2 0.28 0.4   | 0.85 1.2 1.75  | 70      | 10      | 1000 roll  | 450     | 0.014 |              | footprint_area
    Ten-mil sheet, lapped a foot, taped, turned up the wall.
  crawl-space/closed       | Crawl space closed and lined   | sf   | A2020     | 0.9 1.25 1.75  | 4 5.6 8        | 62      | 10      |            | 2500    | 0.07  |              | footprint_area
    Heavy liner on ground and walls, vents closed, insulated; radon and combustion air looked at first.
  crawl-space/vent         | Foundation vent                | each | A2020     | 16 26 40       | 85 130 200     | 72      | 0       |            | 220     | 1.2   |              | 6
    Screened vent in the old hole.
  crawl-space/access-door  | Crawl space access door        | each | A2020     | 55 90 140      | 220 330 500    | 66      | 0       |            | 220     | 3     |              | 1
    Insulated, gasketed, with a lock.
  crawl-space/clean-out    | Debris cleared from below      | sf   | F2010     | 0.1 0.18 0.3   | 1.1 1.7 2.7    | 88      | 0       |            | 450     | 0.03  | floor_area   | footprint_area
    Bagged and carried out; not droppings, not fibrous debris.
  crawl-space/drain-inside | Perimeter drain, inside        | lf   | A2020     |                | 52 74 105      | 66      | 0       |            | 3000    | 0     |              | outside_perimeter
    Slab edge cut, pipe and stone to a sump, slab patched.
  crawl-space/sump-pump    | Sump pit and pump              | each | D2090     | 260 370 520    | 950 1350 1900  | 58      | 0       |            | 800     | 8     |              | 1
    Pit, pump, check valve, discharge well away from the wall.
  crawl-space/pump-back-up | Battery back-up pump           | each | D2090     | 280 390 540    | 650 880 1200   | 45      | 0       |            | 450     | 3     |              | 1
    Second pump on its own battery with an alarm.
  crawl-space/dehumidifier | Dehumidifier with drain        | each | D3090     | 240 320 450    | 420 580 850    | 35      | 0       |            | 250     | 1.5   |              | 1
    Large portable, hose to the drain or pump.
  crawl-space/wall-coat    | Cellar walls, masonry coat     | sf   | A2020     | 0.28 0.4 0.56  | 1.3 1.9 2.8    | 76      | 5       | 75 gallon  | 400     | 0.025 | wall_area    | 400
    Two coats on clean bare masonry. Slows damp, holds back no water.
  crawl-space/floor-paint  | Cellar floor painted           | sf   | A1030     | 0.22 0.32 0.46 | 1.1 1.6 2.4    | 76      | 5       | 200 gallon | 350     | 0.02  | floor_area   | 400
    Cleaned, etched, two coats; only on a dry slab.
  crawl-space/rim-seal     | Rim joist sealed and insulated | lf   | B1010     | 1.4 2 2.9      | 4.5 6.5 9.5    | 60      | 5       |            | 350     | 0.12  |              | outside_perimeter
    Cut foam board with a foamed edge in each bay.
  crawl-space/stair-rail   | Cellar stair rail and guard    | each | C2010     | 60 95 150      | 290 430 640    | 72      | 0       |            | 250     | 4     | 1            | 1
    Graspable rail to the foot, guard on the open side.
  crawl-space/cellar-stair | Cellar stair rebuilt           | each | C2010     | 240 340 480    | 1100 1600 2300 | 70      | 0       |            | 800     | 14    | 1            | 1
    Three stringers, treads, risers, rail; headroom as found.
  `,
)

/** Pests. */
export const pestItems = priceTable(
  { system: 'pests', trade: 'pest-control', priceDate: '2026-03-24' },
  `
  key                     | name                              | unit | uniformat | own hands    | hired         | labor % | waste % | package    | minimum | hours | room formula | house formula
  pest/entry-sealed       | Entry hole sealed                 | each | B2010     | 6 10 17      | 45 70 110     | 80      | 0       |            | 220     | 0.6   |              | 8
    Mesh, sealant or flashing at a hole larger than a pencil.
  pest/mesh-screen        | Hardware mesh at the ground line  | lf   | B2010     | 1.8 2.6 3.8  | 9 13.5 20     | 76      | 5       | 25 roll    | 300     | 0.2   |              | outside_perimeter * 0.3
    Quarter-inch mesh let into the ground a foot.
  pest/trap-visits        | Rodent trapping, four visits      | lump | B1010     |              | 320 460 680   | 85      | 0       |            | 320     | 0     |              | 1
    Set, checked, carried off, with a report of how they get in.
  pest/droppings-clean-up | Droppings cleaned up              | sf   | F2020     |              | 1.6 2.6 4.2   | 84      | 0       |            | 600     | 0     | floor_area   | footprint_area * 0.3
    By a firm that does this work: wetted, bagged, wiped down with disinfectant, masks throughout.
  pest/termite-soil       | Termite soil treatment            | lf   | B1010     |              | 5.5 8 12      | 66      | 0       |            | 750     | 0     |              | outside_perimeter
    Licensed applicator, drilled where paved, a year's guarantee.
  pest/termite-bait       | Termite bait stations, first year | lf   | B1010     |              | 4.2 6.2 9     | 60      | 0       |            | 700     | 0     |              | outside_perimeter
    Stations and visits for a year.
  pest/borate             | Borate on bare framing            | sf   | B1010     | 0.14 0.2 0.3 | 0.7 1.05 1.6  | 78      | 5       | 200 gallon | 300     | 0.012 |              | footprint_area
    Sprayed on clean bare wood before it is closed.
  pest/bat-exclusion      | Bats let out and kept out         | lump | B2010     |              | 750 1250 2100 | 82      | 0       |            | 750     | 0     |              | 1
    One-way doors in the lawful season, all gaps sealed. Never while there are young.
  pest/nest-removed       | Wasp or bird nest removed         | each | B2010     |              | 140 220 350   | 85      | 0       |            | 140     | 0     |              | 1
    Outside the season when the law protects it.
  `,
)
