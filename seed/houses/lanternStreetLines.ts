import { lineTable, type DemoLine } from './lineTable.ts'

/** Outside, from roof to ground. */
const lanternOutside = lineTable(`
  room           | item                              | quantity             | by        | evidence | own price
  house          | roof/strip-one-layer              |                      | hired     | measured |
  house          | roof/strip-further-layer          | roof_squares         | hired     | seen     |
    A second layer shows at the rake; the front slope may have a third.
  house          | roof/sheathing-over-boards        | roof_area * 0.35     | hired     | seen     |
    Old boards with gaps on the back slope. Seen from the attic only.
  house          | roof/underlayment                 |                      | hired     | measured |
  house          | roof/ice-barrier                  | eave_length          | hired     | measured |
  house          | roof/drip-edge                    | eave_length + 70     | hired     | measured |
    Eaves, and four rakes of seventeen and a half feet.
  house          | roof/shingles-laminated           |                      | hired     | measured |
  house          | roof-vent/ridge                   |                      | hired     | measured |
  house          | roof/chimney-flashing             | 1                    | hired     | seen     |
  house          | roof/pipe-boot                    | 2                    | hired     | measured |
  house          | roof/chimney-repoint              | 1                    | hired     | seen     |
    Six courses above the roof are open; the crown is cracked.
  house          | roof/gutter                       |                      | hired     | measured |
  house          | roof/downspout                    | 44                   | hired     | measured |
  house          | roof-vent/soffit-strip            | eave_length * 0.5    | hired     | seen     |
    Closed soffit on both eaves; a strip in every second bay to begin with.
  house          | roof-vent/bath-duct               | 1                    | hired     | seen     |
    The bath has no fan now; the new one needs a way out.
  house          | siding/brick-repoint              | 70                   | hired     | measured |
    Below the sills on the weather side and around the porch piers.
  house          | siding/paint-lead-safe            | gable_area           | hired     | measured |
    Gables and dormer cheek. Painted before 1978, flaking: certified firm.
  house          | siding/eaves-paint                | eave_length + 70     | hired     | measured | 4.2 5.8 8.4
    Same firm, same staging.
    because old paint: priced as lead-safe work
  house          | site/regrade                      | 40                   | hired     | measured |
    Ground slopes to the house along the north side.
  house          | site/downspout-leader             | 4                    | own hands | measured |
  house          | floor-structure/porch-deck-boards | 24 * 7.2 * 0.4       | hired     | measured |
    Front porch, twenty-four by seven feet; the outer part is soft.
`)

/** Windows and outside doors. */
const lanternOpenings = lineTable(`
  room           | item                              | quantity             | by        | evidence | own price
  house          | window/cord-and-lock              | 11                   | own hands | measured |
    Old double-hung sashes are sound; they stay behind storms.
  house          | window/storm                      | 11                   | hired     | measured |
  middle-bedroom | egress/casement-same-opening      | 1                    | hired     | measured |
    The only window is painted shut and 22 inches clear. The local code decides what is needed.
  middle-bedroom | window/lead-safe-set-up           | 1                    | hired     | measured |
  cellar         | window/cellar-hopper              | windows              | own hands | measured |
  house          | outside-door/steel-entry          | 1                    | hired     | measured |
    Back door.
`)

/** Cellar, foundation and floor frame. */
const lanternBelow = lineTable(`
  room           | item                              | quantity             | by        | evidence | own price
  cellar         | foundation/repoint-inside         | 160                  | own hands | measured |
    North and east walls; lime mortar.
  cellar         | foundation/floor-post             | 2                    | hired     | measured |
  cellar         | foundation/footing-pad            | 2                    | hired     | measured |
  cellar         | crawl-space/sump-pump             | 1                    | hired     | seen     |
  cellar         | crawl-space/rim-seal              | perimeter            | own hands | measured |
  cellar         | crawl-space/stair-rail            | 1                    | own hands | measured |
  house          | pest/entry-sealed                 | 9                    | own hands | measured |
  kitchen        | floor-structure/subfloor-patch    | 1                    | hired     | measured |
    Soft in front of the sink.
  bath           | floor-structure/tub-rot           | 1                    | hired     | seen     |
    Stained from below at the tub drain; the moisture readings will tell how far.
  house          | hazard/pipe-wrap-encapsulated     | 34                   | hired     | measured |
    Wrapped risers in the cellar. Left as they are until the samples are back.
`)

/** Pipes, wires and heat. */
const lanternServices = lineTable(`
  room           | item                              | quantity             | by        | evidence | own price
  house          | supply-pipe/repipe-fixture        | 8                    | hired     | measured |
    Old steel pipe, low flow at the tub. Kitchen two, bath three, laundry two, hose one.
  house          | supply-pipe/main-shut-off         | 1                    | hired     | seen     |
  house          | drain-pipe/renew-small-house      | 1                    | hired     | seen     |
    Iron stack is split at a hub; branches are galvanized.
  house          | sewer/clean-out                   | 1                    | hired     | seen     |
    None found.
  house          | water-heater/gas-40               | 1                    | hired     | measured |
    Made in 2009.
  house          | water-heater/vent-liner           | 28                   | hired     | seen     |
  house          | electrical/service-200            | 1                    | hired     | measured |
    Sixty amp fuses now.
  house          | electrical/old-wiring-retired     | 9                    | hired     | seen     |
    Open wiring seen in the cellar and in the attic.
  house          | electrical/circuit-20             | 5                    | hired     | measured |
    Kitchen two, bath, laundry, refrigerator.
  house          | electrical/outlet-grounded        | 14                   | hired     | measured |
  house          | light/device-protected            | 7                    | hired     | measured |
  house          | light/smoke-alarm-wired           | 6                    | hired     | measured |
  house          | light/carbon-monoxide-alarm       | 2                    | own hands | measured |
  house          | heat/boiler-repair                | 1                    | hired     | seen     |
    Gas boiler of 1998 fires; relief valve weeps.
  kitchen        | heat/radiator-moved               | 1                    | hired     | measured |
    Stands where the base cabinets go.
  house          | insulation/attic-blown-cellulose  | footprint_area * 0.6 | hired     | seen     |
    Outside the attic room; after the open wiring is out.
  attic-room     | insulation/knee-wall              | 176                  | own hands | measured |
`)

/** Room by room. */
const lanternRooms = lineTable(`
  room           | item                              | quantity             | by        | evidence | own price
  living         | floor/refinish-wood               | floor_area           | hired     | measured |
    Finish tested for lead before the sander comes.
  dining         | floor/refinish-wood               | floor_area           | hired     | measured |
  hall           | floor/refinish-wood               | floor_area           | hired     | measured |
  front-bedroom  | floor/refinish-wood               | floor_area           | hired     | measured |
  middle-bedroom | floor/refinish-wood               | floor_area           | hired     | measured |
  back-bedroom   | floor/refinish-wood               | floor_area           | hired     | measured |
  back-bedroom   | smell/seal-floor                  | 30                   | own hands | seen     |
    Pet stain by the closet.
  kitchen        | floor-structure/underlay-sheet    | floor_area           | own hands | measured |
    Over the old resilient floor, which stays undisturbed.
  kitchen        | floor/plank-vinyl                 | floor_area           | own hands | measured |
  attic-room     | floor/carpet                      | floor_area           | hired     | measured |
  living         | wall/plaster-repair               | 40                   | hired     | measured |
  house          | wall/spot-patch                   | 6                    | own hands | measured |
  living         | wall/paint-coat                   | wall_area * 2        | own hands | measured |
  dining         | wall/paint-coat                   | wall_area * 2        | own hands | measured |
  hall           | wall/paint-coat                   | wall_area * 2        | own hands | measured |
  front-bedroom  | wall/paint-coat                   | wall_area * 2        | own hands | measured |
  middle-bedroom | wall/paint-coat                   | wall_area * 2        | own hands | measured |
  back-bedroom   | wall/paint-coat                   | wall_area * 2        | own hands | measured |
  kitchen        | wall/paint-coat                   | wall_area * 2        | own hands | measured |
  living         | ceiling/texture-scrape            | ceiling_area         | hired     | seen     |
    Only when the samples are clear; if not, the unknown takes its place.
  dining         | ceiling/texture-scrape            | ceiling_area         | hired     | seen     |
    As in the living room.
  kitchen        | ceiling/board-overlay             | ceiling_area         | hired     | measured |
  house          | inside-door/adjust                | 8                    | own hands | measured |
  kitchen        | trim/base                         | base_length          | own hands | measured |
  house          | trim/trim-lead-safe               | 120                  | hired     | seen     |
    Window stools and base where paint is failing.
  house          | floor/transition                  | 3                    | own hands | measured |
`)

/** Kitchen, bath, laundry. */
const lanternWetRooms = lineTable(`
  room           | item                              | quantity             | by        | evidence | own price
  kitchen        | kitchen/cabinets-out              | 16                   | hired     | measured |
  kitchen        | kitchen/base-cabinet-stock        | 14                   | hired     | measured |
  kitchen        | kitchen/wall-cabinet-stock        | 11                   | hired     | measured |
  kitchen        | kitchen/counter-laminate          | 14                   | hired     | measured |
  kitchen        | kitchen/sink-steel                | 1                    | hired     | measured |
  kitchen        | kitchen/faucet                    | 1                    | own hands | bid      | 149 149 149
    because bought already: receipt in the file
  kitchen        | kitchen/range-gas                 | 1                    | hired     | measured |
  kitchen        | kitchen/range-hood                | 1                    | hired     | measured |
  bath           | bathroom/gut                      | floor_area           | hired     | measured |
    After the samples are back.
  bath           | bathroom/tub-steel                | 1                    | hired     | measured |
  bath           | bathroom/tub-valve                | 1                    | hired     | measured |
  bath           | bathroom/backer-and-membrane      | 62                   | hired     | measured |
  bath           | bathroom/surround-tile            | 62                   | hired     | measured |
  bath           | wall/board-moisture               | wall_area - 62       | hired     | measured |
  bath           | floor/tile-mosaic                 | floor_area           | hired     | measured |
  bath           | inside-wall/blocking-behind       | 5                    | own hands | measured |
    For the grab bars and the new vanity, while the wall is open.
  bath           | bathroom/toilet                   | 1                    | hired     | measured |
  bath           | bathroom/vanity-30                | 1                    | hired     | measured |
  bath           | bathroom/faucet                   | 1                    | own hands | measured |
  bath           | bathroom/fan                      | 1                    | hired     | measured |
  cellar         | laundry/dryer-vent                | 1                    | own hands | measured |
`)

/** Tests, disposal, protection. */
const lanternPaperwork = lineTable(`
  room           | item                              | quantity             | by        | evidence | own price
  house          | inspection/whole-house            | 1                    | hired     | bid      | 465 465 465
    because the inspector's quote of 14 May
  house          | inspection/sewer-camera           | 1                    | hired     | measured |
  house          | inspection/structural             | 1                    | hired     | measured |
  house          | test/asbestos-samples             | 6                    | hired     | measured |
    Two ceilings, kitchen floor, pipe wrap, plaster, siding paper.
  house          | test/lead-survey                  | 1                    | hired     | measured |
  house          | test/radon                        | 1                    | own hands | measured |
  house          | job/dumpster-20                   | 2                    | hired     | seen     |
  house          | job/dumpster-10-heavy             | 1                    | hired     | seen     |
  house          | job/floor-protection              | 400                  | own hands | measured |
  house          | job/final-clean                   | living_area          | hired     | measured |
`)

/** Work that the price book has no item for. */
const lanternOwnLines: DemoLine[] = [
  {
    roomKey: null,
    itemKey: null,
    ownWork: { system: 'outside-doors', trade: 'windows-doors', description: 'Leaded glass of the front door mended', unit: 'each' },
    quantity: '1',
    basis: 'hired',
    evidence: 'seen',
    override: {
      price: { low: 2_600_000, likely: 3_800_000, high: 6_200_000 },
      reason: 'A glazier’s word on the telephone; no item in the book',
    },
    note: 'Two broken lights and loose leads. The paint of the stops is of an age to hold lead.',
  },
]

export const lanternStreetLines = [
  ...lanternOutside,
  ...lanternOpenings,
  ...lanternBelow,
  ...lanternServices,
  ...lanternRooms,
  ...lanternWetRooms,
  ...lanternPaperwork,
  ...lanternOwnLines,
]
