import { priceTable } from './priceTable.ts'

/** Covering, stripping, decking. */
export const roofCoveringItems = priceTable(
  { system: 'roof', trade: 'roofing', priceDate: '2026-02-17' },
  `
  key                        | name                              | unit   | uniformat | own hands      | hired         | labor % | waste % | package       | minimum | hours | room formula | house formula
  roof/strip-one-layer       | Strip one layer of shingles       | square | B3010     | 8 12 18        | 55 75 105     | 88      | 0       |               | 450     | 1.8   |              | roof_squares
    Old shingles and felt off to the deck, nails pulled, raked into the dumpster. The dumpster is its own line.
  roof/strip-further-layer   | Strip each further layer          | square | B3010     | 5 8 12         | 28 40 58      | 90      | 0       |               | 0       | 1.1   |              | roof_squares
    Added where a second or third layer lies below the first.
  roof/shingles-laminated    | Laminated asphalt shingles        | square | B3010     | 118 140 172    | 330 400 510   | 58      | 10      | 0.3333 bundle | 900     | 2.4   |              | roof_squares
    Shingles, starter, nails. Underlayment, edge metal, ridge and flashing are their own lines.
  roof/shingles-three-tab    | Three-tab asphalt shingles        | square | B3010     | 98 115 138     | 280 340 430   | 60      | 10      | 0.3333 bundle | 900     | 2.2   |              | roof_squares
    The plainest shingle, for a garage or a shed roof that must match.
  roof/shingles-overlay      | Shingles over one sound layer     | square | B3010     | 120 142 175    | 290 350 445   | 55      | 10      | 0.3333 bundle | 900     | 2.2   |              | roof_squares
    Only over one flat, dry layer. Longer nails included, no stripping.
  roof/underlayment          | Roofing underlayment, felt        | square | B3010     | 7 9 12         | 18 25 34      | 62      | 8       | 4 roll        | 0       | 0.25  |              | roof_squares
    Fifteen-pound felt with cap nails; a roll covers four squares.
  roof/ice-barrier           | Ice and water barrier at eaves    | lf     | B3010     | 1.7 2.1 2.7    | 3.2 4.2 5.6   | 48      | 8       | 66 roll       | 0       | 0.04  |              | eave_length
    Self-sticking sheet a yard wide, one course along the eave. Take two courses where the overhang is deep.
  roof/sheathing-part        | Roof sheathing, part replaced     | sf     | B1020     | 0.85 1.05 1.35 | 2.6 3.4 4.6   | 62      | 5       | 32 4×8 sheet  | 350     | 0.04  |              | roof_area * 0.1
    Half-inch sheets in place of soft or split boards. One tenth of the roof is the usual guess before it is stripped.
  roof/sheathing-over-boards | Roof sheathing over spaced boards | sf     | B1020     | 0.8 0.98 1.25  | 1.9 2.5 3.4   | 55      | 6       | 32 4×8 sheet  | 500     | 0.025 |              | roof_area
    Seven-sixteenths sheets over old spaced boards, so that shingles can be nailed anywhere.
  roof/metal-panel           | Ribbed steel roof panel           | square | B3010     | 210 265 340    | 560 720 950   | 52      | 8       |               | 1500    | 3.2   |              | roof_squares
    Screwed steel panel, trims and closures over underlayment.
  roof/flat-membrane         | Rubber membrane on a flat roof    | square | B3010     | 260 330 430    | 850 1080 1400 | 55      | 8       |               | 1500    | 4.5   |              | roof_squares
    Membrane, cover board, glue and edge metal on a sound deck.
  roof/flat-coating          | Coating on a sound flat roof      | square | B3010     | 60 85 120      | 190 260 360   | 55      | 5       | 2.5 pail      | 600     | 1.4   |              | roof_squares
    Wash, seams taped, two coats. Not over a roof that holds water.
  roof/patch-shingles        | Patch shingles, one place         | each   | B3010     | 35 60 110      | 300 450 750   | 80      | 0       |               | 300     | 3     |              | 1
    Up to thirty-two square feet in one place, with the felt below it.
  roof/slates-replace        | Broken slates replaced            | each   | B3010     |                | 45 70 110     | 78      | 0       |               | 600     | 0     |              | 10
    Slate ripper, matching slate, copper hook. Old slate is walked on by slaters alone.
  roof/tarp                  | Emergency roof tarp               | sf     | B3010     | 0.25 0.4 0.65  | 0.9 1.4 2.2   | 70      | 10      |               | 350     | 0.01  |              | roof_area * 0.15
    Heavy tarp with battens, to hold until the roofer comes.
  `,
)

/** Flashing, edges, gutters. */
export const roofEdgeItems = priceTable(
  { system: 'roof', trade: 'roofing', priceDate: '2026-02-24' },
  `
  key                    | name                              | unit | uniformat | own hands   | hired          | labor % | waste % | package   | minimum | hours | room formula | house formula
  roof/drip-edge         | Drip edge                         | lf   | B3010     | 0.9 1.2 1.6 | 2.2 3 4.2      | 60      | 5       | 10 stick  | 150     | 0.03  |              | outside_perimeter
    Painted aluminum at eaves and rakes.
  roof/valley-flashing   | Valley flashing                   | lf   | B3010     | 3.2 4.5 6.5 | 9 13 19        | 62      | 8       | 10 stick  | 200     | 0.12  |              | 20
    Two-foot metal valley over ice barrier.
  roof/step-flashing     | Step and counter flashing         | lf   | B3010     | 4 6 9       | 16 24 36       | 70      | 8       |           | 300     | 0.25  |              | 16
    At a wall or a chimney side; the old mortar joint is raked and refilled.
  roof/chimney-flashing  | Chimney flashing renewed          | each | B3010     | 60 95 150   | 350 520 800    | 75      | 0       |           | 350     | 6     |              | 1
    Apron, steps and back pan of one ordinary chimney.
  roof/pipe-boot         | Pipe boot                         | each | B3010     | 12 18 28    | 75 120 185     | 80      | 0       |           | 150     | 0.7   |              | 2
    Collar at each vent pipe through the roof.
  roof/ridge-cap         | Ridge cap shingles                | lf   | B3010     | 1.9 2.4 3.2 | 4 5.4 7.5      | 52      | 8       | 25 bundle | 0       | 0.05  |              | ridge_length
    Where no ridge vent is cut in.
  roof/gutter            | Aluminum gutter                   | lf   | D2040     | 3.2 4.4 6   | 7.5 10 14      | 48      | 5       | 10 stick  | 350     | 0.15  |              | eave_length
    Five-inch gutter with hangers, corners and outlets.
  roof/downspout         | Downspout                         | lf   | D2040     | 2.6 3.4 4.6 | 6 8.5 12       | 50      | 5       | 10 stick  | 150     | 0.12  |              | 40
    Elbows, straps and a splash block at each foot.
  roof/gutter-rehang     | Gutters cleaned and rehung        | lf   | D2040     | 0.4 0.7 1.2 | 1.5 2.4 3.8    | 85      | 0       |           | 180     | 0.06  |              | eave_length
    Scooped, flushed, seams sealed, new hangers where loose.
  roof/gutter-guard      | Gutter guard                      | lf   | D2040     | 1.8 3 4.6   | 5 8 13         | 45      | 5       | 4 panel   | 250     | 0.06  |              | eave_length
    Perforated aluminum panel under the first shingle course.
  roof/fascia            | Fascia board replaced             | lf   | B2010     | 3 4.2 6     | 10 14.5 21     | 66      | 10      | 16 stick  | 300     | 0.22  |              | eave_length * 0.25
    Primed board, old one off, rafter tails checked for rot.
  roof/soffit-boards     | Soffit replaced                   | lf   | B2010     | 3.6 5 7.2   | 11 16 23       | 65      | 10      | 12 panel  | 300     | 0.25  |              | eave_length * 0.25
    Vented panel with edge channels, up to sixteen inches wide.
  roof/skylight          | Skylight replaced                 | each | B3020     | 420 560 780 | 1300 1750 2500 | 55      | 0       |           | 900     | 10    |              | 1
    Same opening, new curb flashing; the inside trim touched up.
  roof/chimney-repoint   | Chimney repointed above the roof  | each | B2010     |             | 650 1100 1900  | 82      | 0       |           | 650     | 0     |              | 1
    Scaffold, joints raked and refilled, new crown wash. Mason's work.
  roof/chimney-cap       | Chimney cap and crown seal        | each | B3020     | 70 120 190  | 260 390 600    | 62      | 0       |           | 250     | 2.5   |              | 1
    Stainless cap with mesh and a flexible coat on the crown.
  roof/chimney-take-down | Chimney taken down below the roof | each | F2010     |             | 1400 2300 3800 | 85      | 0       |           | 1400    | 0     |              | 1
    Unused chimney taken to below the deck, roof closed over. Never while anything vents into it.
  `,
)

/** Roof and attic ventilation. */
export const roofVentilationItems = priceTable(
  { system: 'roof-ventilation', trade: 'roofing', priceDate: '2026-03-03' },
  `
  key                     | name                               | unit | uniformat | own hands   | hired       | labor % | waste % | package   | minimum | hours | room formula | house formula
  roof-vent/ridge         | Ridge vent                         | lf   | B3020     | 3 3.9 5.2   | 8 11 15     | 58      | 5       | 4 section | 300     | 0.14  |              | ridge_length
    Slot cut, vent and cap shingles. Give it as much vent at the eave.
  roof-vent/soffit-strip  | Soffit vent strip                  | lf   | B3020     | 2 2.8 4     | 6.5 9.5 14  | 68      | 5       | 8 strip   | 250     | 0.16  |              | eave_length
    Slot cut in a closed soffit, screened strip let in.
  roof-vent/soffit-grille | Soffit vent grille                 | each | B3020     | 5 8 13      | 32 48 75    | 80      | 0       |           | 180     | 0.5   |              | ceil(eave_length / 8)
    One eight by sixteen grille about every eight feet.
  roof-vent/gable-louver  | Gable louver                       | each | B3020     | 45 75 120   | 180 270 420 | 66      | 0       |           | 200     | 2.2   |              | 2
    Screened louver, framed, flashed and painted.
  roof-vent/box           | Box vent through the roof          | each | B3020     | 16 26 40    | 95 145 220  | 74      | 0       |           | 200     | 1.2   |              | 3
    Low vent with its own flashing, near the ridge.
  roof-vent/baffle        | Rafter baffle at the eave          | each | B3010     | 2 3 4.6     | 7 11 17     | 68      | 0       |           | 150     | 0.2   |              | ceil(eave_length / 2)
    Keeps an air way over the insulation in each rafter bay.
  roof-vent/fan-solar     | Attic fan, sun-powered             | each | D3040     | 210 310 450 | 480 680 980 | 48      | 0       |           | 350     | 3     |              | 1
    Fan, panel and flashing. Only with enough vent at the eaves.
  roof-vent/bath-duct     | Bath fan ducted to the outdoors    | each | D3040     | 40 65 100   | 220 340 520 | 72      | 0       |           | 220     | 3     | 1            | 1
    Smooth insulated duct and a roof or wall cap, in place of a fan that blows into the attic.
  roof-vent/soffit-reopen | Painted-shut soffit vents reopened | each | B3020     | 3 5 9       | 18 30 48    | 88      | 0       |           | 150     | 0.5   |              | ceil(eave_length / 8)
    New screen in each. Old paint at the eave is a matter for a lead-safe firm.
  roof-vent/attic-hatch   | Attic hatch, sealed and insulated  | each | C3030     | 35 60 95    | 140 220 340 | 66      | 0       |           | 150     | 2     | 1            | 1
    Gasket, foam board cover and latches.
  `,
)
