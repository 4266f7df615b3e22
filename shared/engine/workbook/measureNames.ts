/** What a room's measure is called in formulas: the second room's `wall_area` → `room_2_wall_area`. Rooms count from 1. */
export function roomMeasureName(roomNumber: number, measure: string): string {
  return `room_${roomNumber}_${measure}`
}

/** What a measure of the house is called: `roof_squares` → `house_roof_squares`. */
export function houseMeasureName(measure: string): string {
  return `house_${measure}`
}
