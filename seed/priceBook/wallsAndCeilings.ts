import { priceTable } from './priceTable.ts'

/** Wall paint and surface. */
export const wallPaintItems = priceTable(
  { system: 'walls', trade: 'painting', priceDate: '2026-02-19' },
  `
  key                        | name                              | unit | uniformat | own hands       | hired         | labor % | waste % | package    | minimum | hours | room formula    | house formula
  wall/paint-coat            | Walls painted, each coat          | sf   | C3010     | 0.085 0.11 0.15 | 0.48 0.65 0.9 | 82      | 5       | 350 gallon | 280     | 0.009 | wall_area * 2   | sum_rooms(wall_area) * 2
    Key the wall area times the coats. Sound paint, holes filled, light sanding of modern paint only.
  wall/prime                 | Walls primed                      | sf   | C3010     | 0.075 0.1 0.14  | 0.4 0.55 0.78 | 80      | 5       | 300 gallon | 250     | 0.008 | wall_area       | sum_rooms(wall_area)
    One coat on new board or a strong color.
  wall/stain-blocking-primer | Walls sealed with stain blocker   | sf   | C3010     | 0.13 0.18 0.26  | 0.6 0.85 1.25 | 74      | 5       | 300 gallon | 280     | 0.01  | wall_area       | sum_rooms(wall_area)
    Smoke, water marks and smells, after the source is cured.
  wall/paint-lead-safe       | Failing old wall paint, lead-safe | sf   | C3010     |                 | 2.2 3.2 4.8   | 84      | 0       |            | 900     | 0     | wall_area       | 300
    Certified firm: room closed off, wet work, clean-up checked, prime and two coats.
  wall/spot-patch            | Holes and cracks patched, a room  | each | C3010     | 14 24 40        | 130 200 310   | 90      | 0       |            | 150     | 2.5   | 1               | 8
    Nail pops, small cracks, old anchors; ready for paint.
  wall/wallpaper-off         | Wallpaper taken off               | sf   | C3010     | 0.06 0.1 0.16   | 0.85 1.25 1.9 | 92      | 0       |            | 250     | 0.03  | wall_area       | 300
    Scored, wetted, stripped, sized. Paint below of an age to hold lead is tested first.
  wall/wallpaper             | Wallpaper hung                    | sf   | C3010     | 1.4 2.2 3.8     | 3.4 5 7.8     | 52      | 15      | 28 roll    | 350     | 0.05  | wall_area * 0.3 | 120
    Plain pattern, lining apart.
  wall/paneling-painted      | Wood paneling primed and painted  | sf   | C3010     | 0.26 0.36 0.5   | 1.2 1.7 2.4   | 78      | 5       | 150 gallon | 300     | 0.02  | wall_area       | 300
    Washed, bonding primer, two coats, grooves filled by brush.
  wall/wash                  | Walls washed                      | sf   | C3010     | 0.02 0.03 0.05  | 0.22 0.33 0.5 | 92      | 0       |            | 150     | 0.006 | wall_area       | sum_rooms(wall_area)
    Grease and smoke film off before paint.
  `,
)

/** Wallboard, plaster, paneling. */
export const wallBoardItems = priceTable(
  { system: 'walls', trade: 'drywall', priceDate: '2026-02-26' },
  `
  key                 | name                            | unit | uniformat | own hands      | hired        | labor % | waste % | package      | minimum | hours | room formula    | house formula
  wall/board          | Wallboard hung and finished     | sf   | C3010     | 0.52 0.68 0.9  | 2.1 2.8 3.9  | 72      | 10      | 32 4×8 sheet | 450     | 0.045 | wall_area       | sum_rooms(wall_area) * 0.3
    Half-inch board, screws, three coats of compound, ready for primer.
  wall/board-over     | Thin wallboard over old plaster | sf   | C3010     | 0.5 0.65 0.86  | 2.2 2.9 4    | 72      | 10      | 32 4×8 sheet | 450     | 0.045 | wall_area       | 300
    Three-eighths board screwed to the framing; jambs and boxes extended apart. Old plaster stays undisturbed.
  wall/board-moisture | Moisture-resistant board        | sf   | C3010     | 0.7 0.9 1.2    | 2.6 3.5 4.8  | 68      | 10      | 32 4×8 sheet | 350     | 0.05  | wall_area       | 120
    In baths outside the tub, behind a sink.
  wall/board-patch    | Wallboard patch                 | each | C3010     | 12 20 34       | 140 210 320  | 88      | 0       |              | 180     | 2.2   | 1               | 6
    Up to four square feet, cut, backed, finished.
  wall/plaster-repair | Plaster repaired                | sf   | C3010     | 1.4 2.2 3.4    | 9 13.5 20    | 86      | 0       |              | 350     | 0.25  | wall_area * 0.1 | 60
    Loose plaster refixed or cut out, base and finish coats. Tested first where of an age to hold asbestos.
  wall/plaster-skim   | Plaster skim-coated             | sf   | C3010     | 0.28 0.4 0.6   | 2.2 3.1 4.5  | 88      | 5       |              | 450     | 0.06  | wall_area       | 300
    Mesh on cracks, two thin coats.
  wall/board-out      | Wallboard taken out             | sf   | F2010     | 0.03 0.06 0.1  | 0.7 1.05 1.6 | 92      | 0       |              | 280     | 0.02  | wall_area       | 300
    To the studs, nails pulled; compound and texture tested first in an old house.
  wall/plaster-out    | Plaster and lath taken out      | sf   | F2010     | 0.05 0.09 0.15 | 1.4 2.1 3.2  | 92      | 0       |              | 450     | 0.04  | wall_area       | 300
    Only plaster tested free of asbestos; dust held in. Heavy: count it in the dumpster.
  wall/wainscot       | Beadboard wainscot              | sf   | C3010     | 2.4 3.4 4.8    | 7.5 10.5 15  | 62      | 10      | 32 4×8 sheet | 350     | 0.12  | 60              | 60
    Panel, cap and base, ready for paint.
  wall/tile-splash    | Tile on a wall                  | sf   | C3010     | 4.5 7 11       | 17 24 35     | 64      | 10      | 10 box       | 500     | 0.4   | 30              | 30
    Ceramic tile, thin-set, grout, edge trim.
  wall/corner-bead    | Corner bead renewed             | lf   | C3010     | 0.6 0.9 1.3    | 4.2 6.2 9    | 84      | 5       | 8 stick      | 150     | 0.1   | height          | 24
    Bead, tape, compound.
  `,
)

/** Ceilings. */
export const ceilingItems = priceTable(
  { system: 'ceilings', trade: 'drywall', priceDate: '2026-03-04' },
  `
  key                    | name                                     | unit | uniformat | own hands       | hired          | labor % | waste % | package      | minimum | hours | room formula       | house formula
  ceiling/paint-coat     | Ceiling painted, each coat               | sf   | C3030     | 0.08 0.105 0.14 | 0.5 0.68 0.95  | 84      | 5       | 350 gallon   | 250     | 0.01  | ceiling_area * 2   | sum_rooms(ceiling_area) * 2
    Key the ceiling area times the coats; flat white.
  ceiling/prime-stains   | Ceiling stains sealed                    | sf   | C3030     | 0.13 0.18 0.26  | 0.65 0.92 1.35 | 76      | 5       | 300 gallon   | 200     | 0.011 | ceiling_area * 0.2 | sum_rooms(ceiling_area) * 0.2
    Stain blocker where the leak is cured and dry.
  ceiling/board          | Ceiling board hung and finished          | sf   | C3030     | 0.56 0.74 0.98  | 2.5 3.3 4.6    | 74      | 10      | 32 4×8 sheet | 450     | 0.06  | ceiling_area       | sum_rooms(ceiling_area) * 0.3
    Half-inch ceiling board on open joists.
  ceiling/board-overlay  | Board laid over an old ceiling           | sf   | C3030     | 0.6 0.8 1.05    | 2.6 3.5 4.8    | 72      | 10      | 32 4×8 sheet | 450     | 0.055 | ceiling_area       | sum_rooms(ceiling_area)
    Screwed through to the joists. Over a suspect ceiling the fixing is planned with a licensed firm.
  ceiling/texture-paint  | Sound texture painted, unbroken          | sf   | C3030     | 0.12 0.16 0.22  | 0.75 1.05 1.5  | 82      | 5       | 250 gallon   | 280     | 0.012 | ceiling_area       | sum_rooms(ceiling_area)
    One thick sprayed coat, nothing brushed off. Only a texture that is tested, or of a known late make.
  ceiling/texture-scrape | Tested-clear texture scraped and skimmed | sf   | C3030     | 0.3 0.42 0.6    | 2.1 2.9 4.2    | 88      | 0       |              | 450     | 0.06  | ceiling_area       | sum_rooms(ceiling_area)
    Only with a laboratory's answer that it is free of asbestos.
  ceiling/plank-overlay  | Wood plank ceiling over the old          | sf   | C3030     | 2.6 3.6 5       | 6.8 9.2 13     | 58      | 10      | 32 bundle    | 450     | 0.11  | ceiling_area       | 300
    Primed plank on strips, edge molding.
  ceiling/plaster-repair | Ceiling plaster repaired                 | sf   | C3030     | 1.6 2.4 3.8     | 11 16 24       | 86      | 0       |              | 400     | 0.32  | ceiling_area * 0.1 | 60
    Washers where sound, cut and patched where not; tested first.
  ceiling/plaster-out    | Ceiling plaster and lath taken down      | sf   | F2010     | 0.06 0.1 0.16   | 1.8 2.7 4      | 92      | 0       |              | 450     | 0.05  | ceiling_area       | 120
    Only when tested. Insulation above comes with it: look first.
  ceiling/patch          | Ceiling patch                            | each | C3030     | 14 24 40        | 170 260 390    | 88      | 0       |              | 200     | 2.8   | 1                  | 3
    Up to four square feet, texture near to the old.
  ceiling/suspended      | Suspended ceiling, cellar                | sf   | C3030     | 1.9 2.6 3.6     | 4.2 5.8 8      | 52      | 8       | 64 carton    | 600     | 0.06  | ceiling_area       | 400
    Grid and two-foot panels; keeps pipes reachable.
  ceiling/tiles-out      | Ceiling tiles taken down                 | sf   | F2010     | 0.03 0.05 0.09  | 0.7 1.05 1.6   | 92      | 0       |              | 250     | 0.02  | ceiling_area       | 120
    Fiber tiles of known make, or tested.
  ceiling/crown          | Crown molding                            | lf   | C3030     | 1.6 2.4 3.8     | 6 8.8 13       | 68      | 10      | 16 stick     | 280     | 0.14  | perimeter          | 60
    Primed, coped, caulked.
  `,
)
