import { priceTable } from './priceTable.ts'

/** Bathroom fixtures. */
export const bathFixtureItems = priceTable(
  { system: 'bathroom', trade: 'plumbing', priceDate: '2026-03-02' },
  `
  key                        | name                                    | unit | uniformat | own hands   | hired          | labor % | waste % | package | minimum | hours | room formula | house formula
  bathroom/toilet            | Toilet replaced                         | each | D2010     | 150 220 330 | 380 520 730    | 50      | 0       |         | 280     | 2.5   | 1            | 2
    Bowl, tank, seat, wax, stop and connector, old one away.
  bathroom/toilet-reset      | Toilet reset and rebuilt                | each | D2010     | 26 40 62    | 190 280 410    | 82      | 0       |         | 190     | 2     | 1            | 1
    New wax, bolts, fill and flush valves.
  bathroom/vanity-30         | Vanity and top, thirty inches           | each | D2010     | 240 340 490 | 580 780 1100   | 46      | 0       |         | 350     | 4.5   | 1            | 1
    Cabinet, top with bowl, trap; faucet apart.
  bathroom/vanity-48         | Vanity and top, forty-eight inches      | each | D2010     | 480 680 980 | 900 1250 1750  | 40      | 0       |         | 400     | 5.5   | 1            | 1
    As the smaller one.
  bathroom/sink-pedestal     | Pedestal sink                           | each | D2010     | 150 220 330 | 430 590 830    | 54      | 0       |         | 300     | 4     | 1            | 1
    With blocking behind.
  bathroom/faucet            | Bath sink faucet                        | each | D2010     | 55 95 160   | 190 270 400    | 56      | 0       |         | 180     | 1.3   | 1            | 2
    With pop-up drain and connectors.
  bathroom/tub-steel         | Steel tub, set in place                 | each | D2010     | 330 450 620 | 1150 1550 2150 | 60      | 0       |         | 1000    | 9     | 1            | 1
    Five-foot tub, waste and overflow, old one broken up and out. Floor below apart.
  bathroom/tub-iron          | Cast iron tub, set in place             | each | D2010     |             | 1900 2500 3400 | 50      | 0       |         | 1500    | 0     | 1            | 1
    Needs three strong backs and a sound floor.
  bathroom/tub-refinish      | Tub refinished                          | each | D2010     |             | 420 560 780    | 78      | 0       |         | 420     | 0     | 1            | 1
    Sprayed coat by a firm with its own ventilation; chips filled.
  bathroom/tub-valve         | Tub and shower valve                    | each | D2010     | 110 170 260 | 480 680 980    | 66      | 0       |         | 450     | 5     | 1            | 1
    Pressure-balanced valve, spout, head; wall opened from behind where it can be.
  bathroom/shower-pan        | Shower base, ready-made                 | each | D2010     | 230 330 480 | 750 1050 1450  | 60      | 0       |         | 650     | 6     | 1            | 1
    To thirty-two by sixty, drain, mortar bed.
  bathroom/shower-tiled-base | Shower base, tiled on a liner           | each | D2010     |             | 1500 2100 3000 | 70      | 0       |         | 1500    | 0     | 1            | 1
    Sloped bed, liner, drain, tested, tiled.
  bathroom/clawfoot-kept     | Old iron tub kept, new drain and supply | each | D2010     | 190 280 420 | 620 880 1250   | 60      | 0       |         | 450     | 6     | 1            | 1
    Exposed waste, supplies, shower ring. Outside paint may hold lead.
  bathroom/gut               | Bathroom taken back to the studs        | sf   | F2010     | 0.3 0.6 1.1 | 17 25 38       | 90      | 0       |         | 900     | 0.5   | floor_area   | 45
    Measured by floor area. Fixtures, wall and floor finishes out after the tests are back; capped.
  `,
)

/** Bathroom surfaces and fittings. */
export const bathSurfaceItems = priceTable(
  { system: 'bathroom', trade: 'tile', priceDate: '2026-03-09' },
  `
  key                          | name                            | unit | uniformat | own hands      | hired         | labor % | waste % | package      | minimum | hours | room formula | house formula
  bathroom/surround-panels     | Tub surround, panels            | set  | C3010     | 260 380 550    | 750 1050 1450 | 54      | 0       |              | 550     | 6     | 1            | 1
    Three panels glued and sealed over sound board.
  bathroom/surround-tile       | Tub surround, tile              | sf   | C3010     | 5 7.5 11.5     | 19 27 39      | 66      | 10      | 11 box       | 900     | 0.5   | 60           | 60
    Ceramic tile, grout, sealed corners; backer and membrane apart.
  bathroom/backer-and-membrane | Backer board and membrane       | sf   | C3010     | 2 2.7 3.7      | 5.2 7.2 10    | 58      | 10      | 15 3×5 sheet | 300     | 0.08  | 60           | 60
    Cement board, tape, two coats of membrane.
  bathroom/regrout             | Tile regrouted and sealed       | sf   | C3010     | 0.35 0.55 0.85 | 6.5 9.5 14    | 92      | 0       |              | 300     | 0.2   | 60           | 60
    Old grout raked, new grout, corners in sealant.
  bathroom/caulk               | Tub and sink sealant renewed    | each | C3010     | 6 10 16        | 75 115 170    | 88      | 0       |              | 120     | 1     | 1            | 2
    Old bead off, dried, new bead.
  bathroom/fan                 | Bath fan, quiet                 | each | D3040     | 95 140 210     | 330 470 680   | 58      | 0       |              | 280     | 3.5   | 1            | 1
    Eighty cfm on the old duct and box; new duct apart.
  bathroom/mirror-cabinet      | Medicine cabinet or mirror      | each | C1030     | 70 115 190     | 170 250 380   | 46      | 0       |              | 150     | 1.3   | 1            | 1
    Surface mounted.
  bathroom/accessories         | Towel bars, paper holder, hooks | set  | C1030     | 45 75 125      | 130 190 290   | 56      | 0       |              | 120     | 1.5   | 1            | 2
    Four pieces into blocking or anchors.
  bathroom/grab-bar            | Grab bar                        | each | C1030     | 28 42 64       | 110 165 245   | 66      | 0       |              | 150     | 1     | 2            | 3
    Into blocking.
  bathroom/shower-door         | Glass shower door               | each | C1030     | 330 480 720    | 750 1050 1500 | 42      | 0       |              | 500     | 4.5   | 1            | 1
    Sliding, safety glass.
  bathroom/shower-rod          | Shower rod and curtain          | each | C1030     | 24 38 60       | 75 110 165    | 52      | 0       |              | 90      | 0.6   | 1            | 1
    Screwed, not sprung.
  `,
)
