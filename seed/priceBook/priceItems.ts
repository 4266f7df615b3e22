import { roofCoveringItems, roofEdgeItems, roofVentilationItems } from './roof.ts'
import { sidingItems, outsidePaintItems } from './outsideWalls.ts'
import { windowItems, windowRepairItems, egressItems, outsideDoorItems } from './windowsAndDoors.ts'
import { foundationItems, crawlSpaceItems, pestItems } from './foundation.ts'
import { floorStructureItems, insulationItems } from './structure.ts'
import { supplyPipingItems, drainPipingItems, sewerItems, waterHeaterItems } from './plumbing.ts'
import { electricalServiceItems, electricalWiringItems, lightingItems } from './electrical.ts'
import { heatingPlantItems, heatingRoomItems } from './heating.ts'
import { floorCoveringItems, floorWorkItems } from './floors.ts'
import { wallPaintItems, wallBoardItems, ceilingItems } from './wallsAndCeilings.ts'
import { insideWallItems, insideDoorItems, trimItems } from './insideCarpentry.ts'
import { kitchenCabinetItems, kitchenFixtureItems, applianceItems } from './kitchen.ts'
import { bathFixtureItems, bathSurfaceItems } from './bathroom.ts'
import { laundryItems, smellItems } from './laundryAndSmells.ts'
import { siteGroundItems, sitePavingItems, siteBuiltItems } from './site.ts'
import { abatementItems } from './hazards.ts'
import { feeItems, jobItems } from './permits.ts'
import { inspectionItems, testItems } from './inspections.ts'
import type { PriceItemFields } from '../../shared/schemas/priceItem.ts'

/** Version 1 of the demo's price book: base rows, in the order of the house systems. All prices are invented. */
export const priceItems: readonly PriceItemFields[] = [
  ...roofCoveringItems,
  ...roofEdgeItems,
  ...roofVentilationItems,
  ...sidingItems,
  ...outsidePaintItems,
  ...windowItems,
  ...windowRepairItems,
  ...egressItems,
  ...outsideDoorItems,
  ...foundationItems,
  ...crawlSpaceItems,
  ...pestItems,
  ...floorStructureItems,
  ...insulationItems,
  ...supplyPipingItems,
  ...drainPipingItems,
  ...sewerItems,
  ...waterHeaterItems,
  ...electricalServiceItems,
  ...electricalWiringItems,
  ...lightingItems,
  ...heatingPlantItems,
  ...heatingRoomItems,
  ...floorCoveringItems,
  ...floorWorkItems,
  ...wallPaintItems,
  ...wallBoardItems,
  ...ceilingItems,
  ...insideWallItems,
  ...insideDoorItems,
  ...trimItems,
  ...kitchenCabinetItems,
  ...kitchenFixtureItems,
  ...applianceItems,
  ...bathFixtureItems,
  ...bathSurfaceItems,
  ...laundryItems,
  ...smellItems,
  ...siteGroundItems,
  ...sitePavingItems,
  ...siteBuiltItems,
  ...abatementItems,
  ...feeItems,
  ...jobItems,
  ...inspectionItems,
  ...testItems,
]
