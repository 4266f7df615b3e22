import { priceTable } from './priceTable.ts'

/** Floor coverings. */
export const floorCoveringItems = priceTable(
  { system: 'floors', trade: 'flooring', priceDate: '2026-02-20' },
  `
  key                   | name                               | unit | uniformat | own hands   | hired       | labor % | waste % | package      | minimum | hours | room formula | house formula
  floor/plank-vinyl     | Vinyl plank, floating              | sf   | C3020     | 2.4 3 3.9   | 5 6 7.2     | 44      | 10      | 22.5 box     | 350     | 0.045 | floor_area   | living_area
    Twenty-mil wear layer with pad on the back, over a flat floor. Base and transitions apart.
  floor/sheet-vinyl     | Sheet vinyl                        | sf   | C3020     | 1.9 2.7 3.7 | 4.6 5.8 7.6 | 48      | 12      |              | 350     | 0.05  | floor_area   | 120
    Twelve-foot goods, glued at edges and seams.
  floor/laminate        | Laminate plank                     | sf   | C3020     | 1.8 2.4 3.2 | 4.2 5.3 6.8 | 50      | 10      | 20 box       | 350     | 0.045 | floor_area   | living_area
    With pad. Not in baths.
  floor/engineered-wood | Engineered wood                    | sf   | C3020     | 4.4 6 8.2   | 8.5 11 14.5 | 40      | 10      | 25 box       | 500     | 0.07  | floor_area   | living_area
    Pre-finished, stapled or glued.
  floor/oak-strip       | Oak strip, site finished           | sf   | C3020     | 5.2 6.8 9   | 11 14 18.5  | 52      | 10      | 20 bundle    | 900     | 0.16  | floor_area   | living_area
    Laid, sanded, three coats.
  floor/oak-laced-in    | Oak strip laced into the old floor | sf   | C3020     | 6.5 9 12.5  | 17 25 37    | 66      | 15      | 20 bundle    | 350     | 0.3   | 12           | 30
    Where a wall, duct or heater came out.
  floor/carpet          | Carpet with pad                    | sf   | C3020     | 1.9 2.7 3.8 | 3.2 4.3 6   | 32      | 8       |              | 300     | 0.025 | floor_area   | living_area
    Cut pile on eight-pound pad, tack strip.
  floor/carpet-stair    | Carpet on a stair, each step       | each | C2020     | 12 18 27    | 26 38 56    | 48      | 5       |              | 220     | 0.4   | 13           | 13
    Wrapped, with pad.
  floor/tile-porcelain  | Porcelain tile                     | sf   | C3020     | 3.6 5.2 7.5 | 12 16 22    | 60      | 10      | 15 box       | 650     | 0.3   | floor_area   | 60
    Up to twelve by twenty-four, thin-set, grout. Backer apart.
  floor/tile-mosaic     | Mosaic tile on a bath floor        | sf   | C3020     | 6 9 13.5    | 17 24 34    | 56      | 10      | 10 box       | 600     | 0.4   | floor_area   | 45
    Mesh-backed, level and sealed.
  floor/tile-backer     | Tile backer board                  | sf   | C3020     | 1 1.35 1.8  | 2.6 3.6 5   | 62      | 8       | 15 3×5 sheet | 250     | 0.05  | floor_area   | 60
    Thin-set below, screwed, taped.
  floor/linoleum-tile   | Linoleum tile                      | sf   | C3020     | 4.2 5.6 7.6 | 7.6 9.8 13  | 40      | 8       | 50 box       | 450     | 0.07  | floor_area   | 120
    Glued over new underlayment.
  floor/stair-tread     | Stair tread and riser covered      | each | C2020     | 32 48 72    | 95 140 210  | 56      | 5       |              | 350     | 0.9   | 13           | 13
    Oak or vinyl cap with nosing.
  `,
)

/** Refinishing, removal, preparation. */
export const floorWorkItems = priceTable(
  { system: 'floors', trade: 'flooring', priceDate: '2026-02-27' },
  `
  key                    | name                             | unit | uniformat | own hands      | hired         | labor % | waste % | package    | minimum | hours | room formula | house formula
  floor/refinish-wood    | Wood floor sanded and refinished | sf   | C3020     | 0.7 1 1.5      | 3.6 4.8 6.5   | 78      | 0       | 125 gallon | 600     | 0.09  | floor_area   | living_area
    Three cuts, edges, three coats. Old finish and paint may hold lead: test before sanding.
  floor/recoat-wood      | Wood floor screened and recoated | sf   | C3020     | 0.28 0.4 0.6   | 1.4 2 2.8     | 78      | 0       | 400 gallon | 350     | 0.02  | floor_area   | living_area
    For a finish that is dull but whole.
  floor/patch-wood       | Wood floor boards patched        | sf   | C3020     | 5 7.5 11       | 16 24 36      | 70      | 15      |            | 350     | 0.3   | 8            | 20
    Matching boards from a closet or the yard.
  floor/carpet-out       | Carpet, pad and strip taken up   | sf   | F2010     | 0.03 0.05 0.08 | 0.4 0.6 0.9   | 92      | 0       |            | 180     | 0.01  | floor_area   | living_area
    Rolled, carried out, staples pulled.
  floor/plank-out        | Loose-laid plank taken up        | sf   | F2010     | 0.02 0.04 0.07 | 0.6 0.9 1.35  | 92      | 0       |            | 180     | 0.015 | floor_area   | 120
    Floating floor only. Glued old resilient flooring is left for the tester.
  floor/tile-out         | Ceramic tile taken up            | sf   | F2010     | 0.1 0.2 0.35   | 2.6 3.8 5.6   | 92      | 0       |            | 350     | 0.09  | floor_area   | 60
    To the subfloor; mortar bed or suspect backing is another matter.
  floor/seal-subfloor    | Subfloor sealed against smells   | sf   | C3020     | 0.13 0.18 0.26 | 0.6 0.9 1.35  | 74      | 5       | 300 gallon | 220     | 0.012 | floor_area   | living_area
    One coat of stain-blocking primer before the new floor. Two on bad spots.
  floor/moisture-sheet   | Moisture sheet under plank       | sf   | C3020     | 0.1 0.15 0.22  | 0.35 0.5 0.75 | 60      | 8       | 200 roll   | 150     | 0.006 | floor_area   | 400
    Six-mil sheet, taped, over a slab.
  floor/transition       | Transition strip                 | each | C3020     | 14 22 34       | 42 62 92      | 55      | 0       |            | 120     | 0.5   | doors        | 4
    Reducer or T-strip at a doorway.
  floor/threshold-marble | Marble threshold                 | each | C3020     | 18 28 42       | 70 105 160    | 62      | 0       |            | 130     | 0.8   | 1            | 1
    At a tiled bath.
  floor/garage-coating   | Garage floor coating             | sf   | A1030     | 0.6 0.9 1.4    | 2.8 4 5.8     | 60      | 5       | 250 kit    | 650     | 0.03  | floor_area   | 240
    Ground, patched, two-part coat with grit.
  floor/shoe             | Shoe molding                     | lf   | C3020     | 0.6 0.85 1.2   | 1.8 2.6 3.8   | 66      | 10      | 16 stick   | 150     | 0.04  | base_length  | sum_rooms(base_length)
    Covers the gap of a floating floor where the old base stays.
  `,
)
