import { priceTable } from './priceTable.ts'

/** Floor structure and subfloor. */
export const floorStructureItems = priceTable(
  { system: 'floor-structure', trade: 'carpentry', priceDate: '2026-01-28' },
  `
  key                               | name                               | unit | uniformat | own hands      | hired         | labor % | waste % | package      | minimum | hours | room formula | house formula
  floor-structure/subfloor          | Subfloor replaced                  | sf   | B1010     | 1.5 1.9 2.5    | 4.8 6.5 9     | 64      | 8       | 32 4×8 sheet | 350     | 0.07  | floor_area   | 64
    Old floor cut out, three-quarter sheet glued and screwed.
  floor-structure/subfloor-patch    | Subfloor patch, one sheet or less  | each | B1010     | 55 75 110      | 260 380 560   | 76      | 0       |              | 250     | 3.5   | 1            | 2
    Cut to the joists, blocked, patched flush.
  floor-structure/underlay-sheet    | Underlayment sheets over old floor | sf   | B1010     | 0.85 1.1 1.45  | 2.3 3.1 4.3   | 60      | 8       | 32 4×8 sheet | 300     | 0.03  | floor_area   | living_area
    Quarter to half-inch sheets, stapled, seams filled. Covers an old resilient floor without disturbing it.
  floor-structure/joist-sister      | Joist sistered                     | lf   | B1010     | 2.6 3.6 5.2    | 11 16 24      | 74      | 8       | 16 stick     | 450     | 0.25  | width * 2    | 48
    Same depth, glued and bolted, bearing at both ends.
  floor-structure/joist-replace     | Joist replaced                     | lf   | B1010     | 3.2 4.4 6.2    | 17 25 37      | 76      | 8       | 16 stick     | 600     | 0.45  | width        | 24
    Floor shored, hangers, wiring and pipe moved apart.
  floor-structure/tub-rot           | Rotted floor at a tub or toilet    | each | B1010     | 140 210 330    | 750 1200 2000 | 74      | 0       |              | 500     | 10    | 1            | 1
    Up to twenty square feet of subfloor and two joist ends. What is seen from below decides.
  floor-structure/squeaks           | Squeaking floor screwed down       | sf   | B1010     | 0.08 0.12 0.18 | 0.7 1 1.5     | 88      | 0       |              | 200     | 0.02  | floor_area   | living_area * 0.3
    Screws at each joist before the new floor.
  floor-structure/level-compound    | Floor leveled with compound        | sf   | C3020     | 1.3 1.8 2.6    | 3.6 5 7.2     | 50      | 8       | 24 bag       | 400     | 0.04  | floor_area   | 150
    Primer and a quarter inch of self-leveling compound.
  floor-structure/beam              | Wood beam replaced or added        | lf   | B1010     | 14 20 29       | 62 90 135     | 66      | 8       |              | 1200    | 1.2   | length       | 16
    Engineer's size, built-up or engineered lumber; posts and pads apart.
  floor-structure/jack-and-level    | Sagging floor jacked               | each | B1010     |                | 650 1050 1700 | 85      | 0       |              | 650     | 0     | 1            | 1
    A little each week by a crew that does this; plaster above may crack.
  floor-structure/blocking          | Blocking and bridging              | each | B1010     | 4 6 9          | 22 33 50      | 80      | 0       |              | 250     | 0.4   | 8            | 16
    Solid block between joists, nailed at both ends.
  floor-structure/porch-deck-boards | Porch floor boards replaced        | sf   | B1010     | 4.2 6 8.5      | 12 17 24      | 60      | 10      |              | 450     | 0.16  | floor_area   | 80
    Tongue-and-groove boards, primed on all sides.
  `,
)

/** Insulation. */
export const insulationItems = priceTable(
  { system: 'insulation', trade: 'insulation', priceDate: '2026-02-10' },
  `
  key                              | name                               | unit | uniformat | own hands      | hired       | labor % | waste % | package      | minimum | hours | room formula    | house formula
  insulation/attic-blown-cellulose | Attic, blown cellulose to R-49     | sf   | B3010     | 0.75 0.95 1.2  | 1.5 2 2.7   | 45      | 5       | 40 bag       | 650     | 0.012 |                 | footprint_area
    About fourteen inches; air sealing and baffles first. Never over vermiculite or open old wiring.
  insulation/attic-blown-glass     | Attic, blown glass fiber to R-49   | sf   | B3010     | 0.85 1.05 1.35 | 1.6 2.1 2.9 | 44      | 5       | 45 bag       | 650     | 0.012 |                 | footprint_area
    About seventeen inches.
  insulation/attic-top-up          | Attic, R-19 added                  | sf   | B3010     | 0.36 0.46 0.6  | 0.8 1.1 1.5 | 48      | 5       | 85 bag       | 500     | 0.008 |                 | footprint_area
    Blown over sound, dry, known insulation.
  insulation/attic-batts           | Attic, batts R-38                  | sf   | B3010     | 1.05 1.35 1.75 | 1.9 2.5 3.4 | 42      | 5       | 64 bag       | 450     | 0.018 |                 | footprint_area
    For a small attic with clear joists.
  insulation/floor-batts           | Floor over crawl space, batts R-19 | sf   | B1010     | 0.75 0.95 1.25 | 1.8 2.4 3.3 | 54      | 5       | 75 bag       | 450     | 0.03  |                 | footprint_area
    With wires to hold it against the floor.
  insulation/wall-dense-pack       | Walls, dense-packed from outside   | sf   | B2010     |                | 2.4 3.2 4.4 | 66      | 0       |              | 1200    | 0     |                 | outside_wall_area
    Holes drilled and plugged; old wiring cleared by the electrician first.
  insulation/wall-batts            | Open wall, batts R-13              | sf   | B2010     | 0.55 0.7 0.9   | 1.2 1.6 2.2 | 48      | 5       | 106 bag      | 300     | 0.014 | wall_area * 0.5 | 400
    While the wall is open, before the board.
  insulation/slope-board           | Sloped ceiling, foam board         | sf   | B3010     | 1.7 2.2 2.9    | 4 5.4 7.4   | 52      | 8       | 32 4×8 sheet | 450     | 0.05  | ceiling_area    | 300
    Two inches of board under the rafters with an air way above.
  insulation/knee-wall             | Knee wall insulated and backed     | sf   | B3010     | 1.3 1.7 2.3    | 3.4 4.7 6.6 | 58      | 8       | 32 4×8 sheet | 350     | 0.05  | 80              | 120
    Batts with a rigid back on the attic side.
  insulation/attic-air-seal        | Attic floor air-sealed             | sf   | B3010     | 0.14 0.2 0.3   | 0.6 0.9 1.4 | 80      | 0       |              | 450     | 0.012 |                 | footprint_area
    Foam and sealant at plates, chases and lights before insulating.
  insulation/removed               | Old loose insulation vacuumed out  | sf   | F2010     |                | 1.2 1.7 2.5 | 82      | 0       |              | 900     | 0     |                 | footprint_area
    Only when tested free of asbestos; fouled insulation by a cleaning firm.
  insulation/pipe-wrap             | Hot pipe wrap                      | lf   | D2020     | 0.6 0.9 1.3    | 2.4 3.4 5   | 70      | 5       | 6 tube       | 120     | 0.04  | 20              | 60
    Foam tube on the hot side and in cold spaces.
  insulation/duct-wrap             | Duct sealed and wrapped            | lf   | D3040     | 1.8 2.6 3.8    | 6.5 9.5 14  | 66      | 8       |              | 350     | 0.12  |                 | 60
    Mastic at joints, foil-faced wrap. Old white wrap is left for the tester.
  insulation/cellar-wall-board     | Cellar wall, foam board and strips | sf   | A2020     | 1.5 2 2.7      | 4.2 5.8 8   | 56      | 8       | 32 4×8 sheet | 450     | 0.06  | wall_area       | 400
    On a dry wall only.
  `,
)
