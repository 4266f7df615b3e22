import { lineTable } from './lineTable.ts'

/** The work. */
const ropewalkWork = lineTable(`
  room          | item                        | quantity             | by        | evidence | own price
  house         | roof/flat-coating           | footprint_area / 100 | hired     | seen     |
    Seams lift at the back parapet. The roof inspection comes first.
  house         | siding/brick-repoint        | 40                   | hired     | measured |
  house         | window/sash-pair            | 5                    | own hands | measured |
  house         | outside-door/lock-set       | 2                    | own hands | measured |
  house         | crawl-space/dehumidifier    | 1                    | own hands | measured |
  house         | pest/entry-sealed           | 4                    | own hands | measured |
  house         | supply-pipe/stop-valve      | 7                    | own hands | measured |
  house         | water-heater/electric-50    | 1                    | hired     | measured |
    Made in 2008.
  house         | light/device-protected      | 5                    | hired     | measured |
  house         | light/smoke-alarm           | 5                    | own hands | measured |
  house         | light/carbon-monoxide-alarm | 2                    | own hands | measured |
  house         | heat/tune-up                | 1                    | hired     | measured |
  living        | floor/plank-vinyl           | floor_area           | own hands | measured |
  kitchen       | floor/plank-vinyl           | floor_area           | own hands | measured |
  front-bedroom | floor/carpet                | floor_area           | hired     | measured |
  back-bedroom  | floor/carpet                | floor_area           | hired     | measured |
  house         | floor/transition            | 4                    | own hands | measured |
  living        | wall/paint-coat             | wall_area * 2        | own hands | measured |
  kitchen       | wall/paint-coat             | wall_area * 2        | own hands | measured |
  front-bedroom | wall/paint-coat             | wall_area * 2        | own hands | measured |
  back-bedroom  | wall/paint-coat             | wall_area * 2        | own hands | measured |
  living        | ceiling/paint-coat          | ceiling_area * 2     | own hands | measured |
  living        | trim/base                   | base_length          | own hands | measured |
  kitchen       | kitchen/cabinet-paint       | 22                   | hired     | measured |
  kitchen       | kitchen/counter-wood        | 30                   | own hands | measured |
  kitchen       | kitchen/range-electric      | 1                    | own hands | measured |
  bath          | bathroom/surround-panels    | 1                    | own hands | measured |
  bath          | floor-structure/tub-rot     | 1                    | hired     | seen     |
    Tile moves at the tub's end. Moisture readings will tell how far it goes.
  bath          | bathroom/tub-valve          | 1                    | hired     | measured |
  bath          | bathroom/toilet-reset       | 1                    | own hands | measured |
  bath          | bathroom/fan                | 1                    | hired     | measured |
  house         | laundry/valve-box           | 1                    | own hands | measured |
  house         | smell/seal-walls            | 420                  | own hands | measured |
    Smoke in the stair and the upper hall.
  house         | job/dump-run                | 4                    | own hands | measured |
  house         | permit/building             | 1                    | hired     | measured |
  house         | permit/electrical           | 1                    | hired     | measured |
  house         | inspection/moisture         | 1                    | hired     | measured |
  house         | inspection/roof             | 1                    | hired     | measured |
`)

export const ropewalkLines = [...ropewalkWork]
