/** Room left between neighbours, so that one can be put in between without moving the others. */
const POSITION_STEP = 1024

/** The place below the last (`null`: there is none). */
export function positionAtEnd(last: number | null): number {
  return (last ?? 0) + POSITION_STEP
}

/** A place between two neighbours, or `null` when they have no gap left. Below the last one there is always place. */
export function positionBetween(above: number, below: number | null): number | null {
  if (below === null) return positionAtEnd(above)
  const middle = Math.floor((above + below) / 2)
  return middle > above ? middle : null
}

/** Evenly gapped positions for so many in a row. */
export function positionAt(index: number): number {
  return (index + 1) * POSITION_STEP
}

/** The place right below the one at this index, once all are evenly gapped. */
export function positionBelowIndex(index: number): number {
  return positionAt(index) + POSITION_STEP / 2
}
