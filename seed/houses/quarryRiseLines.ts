import { lineTable } from './lineTable.ts'

/** Outside. */
const quarryOutside = lineTable(`
  room        | item                           | quantity              | by        | evidence | own price
  house       | roof/shingles-overlay          |                       | hired     | measured |
    One flat layer from 2006. The roof inspection says whether it may be laid over.
  house       | roof/drip-edge                 | eave_length           | hired     | measured |
  house       | roof/pipe-boot                 | 3                     | hired     | measured |
  house       | roof-vent/ridge                | 28                    | hired     | measured |
  house       | roof-vent/soffit-reopen        | 8                     | own hands | measured |
  house       | roof/gutter                    | eave_length           | hired     | measured |
  house       | siding/wood-lap-part           | 90                    | hired     | measured |
    Lower courses by the deck and the garage.
  house       | siding/paint                   | outside_wall_area * 2 | hired     | seen     |
    Sound paint of 2015 over an older coat: the lead survey comes first.
  house       | window/slider                  | 8                     | hired     | measured |
    Single-pane aluminum sliders.
  family-room | window/full-frame              | 1                     | hired     | measured |
  house       | window/glass-unit              | 2                     | hired     | measured |
    Fogged picture window halves in the living room.
  bed-3       | egress/casement-same-opening   | 1                     | hired     | measured |
    Sill measured at 47 inches. The local code decides.
  house       | outside-door/patio-slider      | 1                     | hired     | measured |
  house       | outside-door/garage-overhead   | 1                     | hired     | measured |
  house       | site/deck-taken-down           | 140                   | own hands | measured |
  house       | site/deck-new                  | 140                   | hired     | measured |
    Old ledger was nailed only.
  house       | site/deck-rail                 | 30                    | hired     | measured |
  house       | site/drive-asphalt             | 760                   | hired     | measured |
  house       | site/tree-removed              | 2                     | hired     | measured |
`)

/** Below the floor. */
const quarryBelow = lineTable(`
  room        | item                           | quantity              | by        | evidence | own price
  house       | crawl-space/ground-sheet       | 560                   | own hands | measured |
    Half of the house stands over the crawl space.
  house       | crawl-space/access-door        | 1                     | own hands | measured |
  house       | insulation/floor-batts         | 560                   | own hands | measured |
  house       | pest/droppings-clean-up        | 180                   | hired     | seen     |
    Along the crawl space walls. Nobody goes in before the firm is done.
  house       | foundation/crack-inject        | 14                    | hired     | measured |
  house       | insulation/attic-top-up        | footprint_area * 0.75 | hired     | measured |
`)

/** Pipes, wires, heat. */
const quarryServices = lineTable(`
  room        | item                           | quantity              | by        | evidence | own price
  house       | supply-pipe/regulator          | 1                     | hired     | tested   |
    92 psi on the gauge.
  house       | drain-pipe/trap                | 4                     | own hands | measured |
  house       | water-heater/heat-pump-50      | 1                     | hired     | measured |
  house       | electrical/circuit-240         | 1                     | hired     | measured |
  house       | electrical/panel               | 1                     | hired     | measured |
  house       | electrical/aluminum-connection | 64                    | hired     | seen     |
    The 1968 wing: family room, laundry, garage. The electrician counts them.
  house       | light/breaker-arc-fault        | 7                     | hired     | measured |
  house       | light/device-protected         | 6                     | hired     | measured |
  house       | light/smoke-alarm-wired        | 6                     | hired     | measured |
  house       | light/carbon-monoxide-alarm    | 2                     | own hands | measured |
  house       | heat/heat-pump-wall            | 1                     | hired     | measured |
  house       | heat/heat-pump-wall-head       | 2                     | hired     | measured |
  bed-1       | heat/baseboard-electric        | 6                     | hired     | measured |
`)

/** Rooms. */
const quarryRooms = lineTable(`
  room        | item                           | quantity              | by        | evidence | own price
  living      | floor/carpet-out               | floor_area            | own hands | measured |
  living      | floor/refinish-wood            | floor_area            | hired     | seen     |
    Oak seen at one corner below the carpet.
  family-room | floor-structure/underlay-sheet | floor_area            | own hands | measured |
    Nine-inch tile below stays undisturbed.
  family-room | floor/plank-vinyl              | floor_area            | own hands | measured |
  kitchen     | floor/plank-vinyl              | floor_area            | own hands | measured |
  upper-hall  | floor/carpet                   | floor_area            | hired     | measured |
  bed-1       | floor/carpet                   | floor_area            | hired     | measured |
  bed-2       | floor/carpet                   | floor_area            | hired     | measured |
  bed-3       | floor/carpet                   | floor_area            | hired     | measured |
  living      | wall/paint-coat                | wall_area * 2         | own hands | measured |
  family-room | wall/paneling-painted          | wall_area             | own hands | measured |
  bed-1       | wall/paint-coat                | wall_area * 2         | own hands | measured |
  bed-2       | wall/paint-coat                | wall_area * 2         | own hands | measured |
  bed-3       | wall/paint-coat                | wall_area * 2         | own hands | measured |
  family-room | ceiling/board-overlay          | ceiling_area          | hired     | measured |
  house       | inside-door/hollow-prehung     | 5                     | hired     | measured |
  garage      | inside-door/fire-rated         | 1                     | hired     | measured |
  garage      | inside-wall/fire-separation    | 210                   | hired     | measured |
  kitchen     | kitchen/cabinet-reface         | 24                    | hired     | measured |
  kitchen     | kitchen/counter-stone          | 42                    | hired     | bid      | 74 74 74
    because the stone yard's quote of 2 June, good for 60 days
  bath        | bathroom/tub-refinish          | 1                     | hired     | measured |
  bath        | bathroom/toilet                | 1                     | hired     | measured |
  half-bath   | bathroom/vanity-30             | 1                     | hired     | measured |
  laundry     | laundry/dryer-vent             | 1                     | own hands | measured |
`)

/** Tests, disposal, running the job. */
const quarryPaperwork = lineTable(`
  room        | item                           | quantity              | by        | evidence | own price
  house       | inspection/roof                | 1                     | hired     | measured |
  house       | inspection/electrical          | 1                     | hired     | measured |
  house       | test/lead-survey               | 1                     | hired     | measured |
  house       | test/asbestos-samples          | 4                     | hired     | measured |
  house       | test/radon                     | 1                     | own hands | measured |
  house       | job/dumpster-20                | 2                     | hired     | seen     |
  house       | job/supervision                | 3                     | hired     | measured |
    The buyer hires the trades one by one.
`)

export const quarryRiseLines = [...quarryOutside, ...quarryBelow, ...quarryServices, ...quarryRooms, ...quarryPaperwork]
