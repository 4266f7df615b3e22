import { priceTable } from './priceTable.ts'

/** Grading, drainage, planting. */
export const siteGroundItems = priceTable(
  { system: 'site', trade: 'site-work', priceDate: '2026-04-07' },
  `
  key                    | name                              | unit | uniformat | own hands     | hired         | labor % | waste % | package | minimum | hours | room formula | house formula
  site/regrade           | Ground sloped away from the house | lf   | G1030     | 2.5 4 6.5     | 11 17 26      | 72      | 5       |         | 650     | 0.3   |              | outside_perimeter * 0.5
    Six feet out, clean fill, topsoil, seed; siding kept clear of soil.
  site/swale             | Swale cut and seeded              | lf   | G1030     | 1 1.7 2.8     | 8 12 18       | 78      | 0       |         | 650     | 0.25  |              | 50
    Shallow, mown.
  site/french-drain      | Drain in stone, outside           | lf   | G3030     | 7 10 15       | 26 38 57      | 66      | 5       |         | 1200    | 0.6   |              | 50
    Trench, fabric, pipe, stone, to daylight.
  site/downspout-leader  | Downspout carried away            | each | G3030     | 22 38 62      | 140 210 320   | 72      | 0       |         | 220     | 2     |              | 4
    Ten to fifteen feet of solid pipe to a pop-up.
  site/window-well-drain | Window well cleaned and drained   | each | G3030     | 18 30 48      | 140 210 330   | 82      | 0       |         | 200     | 2.5   |              | 2
    Dug out, stone, drain opened.
  site/tree-removed      | Tree removed, to eighteen inches  | each | G1010     |               | 650 1050 1800 | 82      | 0       |         | 550     | 0     |              | 1
    With stump ground; near wires only with the utility.
  site/brush-cleared     | Brush cleared from walls          | lf   | G1010     | 0.2 0.4 0.8   | 3.5 5.5 8.5   | 92      | 0       |         | 280     | 0.1   |              | outside_perimeter * 0.6
    Cut back three feet, hauled.
  site/lawn-seed         | Lawn raked and seeded             | sf   | G2050     | 0.06 0.1 0.16 | 0.35 0.52 0.8 | 70      | 5       |         | 300     | 0.008 |              | 1500
    Topsoil where thin, seed, straw.
  site/retaining-block   | Block retaining wall, dry         | sf   | G2040     | 11 16 23      | 30 43 64      | 58      | 5       |         | 1500    | 0.8   |              | 60
    Face area, under four feet, stone and drain behind.
  site/yard-clean-up     | Yard cleared of debris            | load | G1010     | 40 65 105     | 320 470 700   | 80      | 0       |         | 280     | 5     |              | 2
    A truck of fifteen yards, dump fee in.
  `,
)

/** Walks, drive, steps. */
export const sitePavingItems = priceTable(
  { system: 'site', trade: 'masonry', priceDate: '2026-04-07' },
  `
  key                 | name                           | unit | uniformat | own hands      | hired       | labor % | waste % | package | minimum | hours | room formula | house formula
  site/walk-concrete  | Concrete walk                  | sf   | G2030     | 2.4 3.3 4.6    | 9.5 13 18.5 | 62      | 8       |         | 1200    | 0.16  |              | 120
    Old out, base, four inches, broomed.
  site/walk-leveled   | Sunken walk raised             | sf   | G2030     |                | 5.5 8 12    | 66      | 0       |         | 650     | 0     |              | 80
    Foam or slurry below, holes patched.
  site/steps-concrete | Concrete steps, each riser     | each | G2030     | 55 80 120      | 290 420 620 | 66      | 0       |         | 900     | 5     |              | 4
    Four feet wide; rail apart.
  site/steps-wood     | Wood outside steps, each riser | each | G2040     | 34 50 74       | 120 175 260 | 64      | 0       |         | 350     | 2     |              | 4
    Treated stringers, treads; rail apart.
  site/drive-asphalt  | Drive overlaid with asphalt    | sf   | G2020     |                | 3.2 4.4 6.2 | 46      | 0       |         | 2200    | 0     |              | 600
    Two inches on a sound base, edges keyed.
  site/drive-gravel   | Drive regraveled               | sf   | G2020     | 0.5 0.75 1.1   | 1.2 1.8 2.7 | 42      | 5       |         | 450     | 0.02  |              | 600
    Two inches of crushed stone, raked.
  site/drive-seal     | Drive cracks filled and sealed | sf   | G2020     | 0.12 0.18 0.27 | 0.4 0.6 0.9 | 66      | 5       |         | 280     | 0.008 |              | 600
    For sound asphalt.
  `,
)

/** Decks, porches, fences, garage. */
export const siteBuiltItems = priceTable(
  { system: 'site', trade: 'carpentry', priceDate: '2026-04-14' },
  `
  key                              | name                                | unit | uniformat | own hands   | hired          | labor % | waste % | package | minimum | hours | room formula | house formula
  site/deck-boards                 | Deck boards replaced                | sf   | G2040     | 4.4 6.2 8.8 | 11 15.5 22     | 56      | 8       |         | 650     | 0.14  |              | 160
    Treated boards on sound framing.
  site/deck-new                    | Deck built new                      | sf   | G2040     | 13 18 25    | 34 47 66       | 56      | 8       |         | 2800    | 0.5   |              | 160
    Treated, on footings, ledger flashed and bolted; rail apart.
  site/deck-ledger                 | Deck ledger refastened and flashed  | lf   | G2040     | 7 11 17     | 32 48 72       | 74      | 0       |         | 450     | 0.6   |              | 16
    Bolts or structural screws, flashing, ties.
  site/deck-rail                   | Deck or porch rail and guard        | lf   | G2040     | 15 22 33    | 42 60 88       | 56      | 5       |         | 400     | 0.6   |              | 24
    Thirty-six inches, balusters under four inches apart.
  site/porch-post                  | Porch post replaced                 | each | G2040     | 65 105 170  | 320 470 700    | 68      | 0       |         | 400     | 4.5   |              | 2
    Shored, new post on a raised base.
  site/deck-taken-down             | Old deck taken down                 | sf   | G1020     | 0.2 0.4 0.8 | 4 6 9          | 90      | 0       |         | 450     | 0.08  |              | 160
    Broken up and hauled, ledger holes sealed.
  site/fence-wood                  | Wood fence, six feet                | lf   | G2040     | 15 21 30    | 34 47 66       | 52      | 5       |         | 900     | 0.5   |              | 60
    Posts in concrete, boards.
  site/fence-repair                | Fence repaired                      | lf   | G2040     | 4 6.5 10    | 15 22 33       | 70      | 0       |         | 280     | 0.35  |              | 30
    Posts and boards as needed.
  site/garage-roof-and-wall-repair | Garage patched, roof edge and walls | lump | G2040     | 280 480 800 | 1300 2000 3200 | 70      | 0       |         | 900     | 26    |              | 1
    An allowance for a detached garage that stays.
  site/garage-taken-down           | Garage taken down                   | sf   | G1020     |             | 9 13 19        | 74      | 0       |         | 3200    | 0     |              | 240
    One car, frame, slab out; suspect siding tested first.
  `,
)
