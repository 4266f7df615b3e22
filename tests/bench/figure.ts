/** One measured figure, as `npm run bench` prints it: a JSON line. The floor is in the same unit and was measured in the same run, as was the peer. */
export interface BenchFigure {
  name: string
  value: number
  unit: string
  /** What it is compared with; `null`: with nothing. */
  peer: string | null
  /** What the least possible takes; `null`: there is none. */
  floor: number | null
  ratio_to_peer: number | null
  ratio_to_floor: number | null
  note?: string
}

interface Measured {
  name: string
  value: number
  unit: string
  peer?: { name: string; value: number }
  floor?: number
  note?: string
}

/** A figure with its ratios. The peer's own figure stands with its name. */
export function benchFigure({ name, value, unit, peer, floor, note }: Measured): BenchFigure {
  return {
    name,
    value,
    unit,
    peer: peer === undefined ? null : `${peer.name}: ${rounded(peer.value)} ${unit}`,
    floor: floor ?? null,
    ratio_to_peer: peer === undefined ? null : value / peer.value,
    ratio_to_floor: floor === undefined ? null : value / floor,
    ...(note === undefined ? {} : { note }),
  }
}

/** Prints a figure as one JSON line. */
export function printFigure(figure: BenchFigure): void {
  console.log(JSON.stringify(figure, (_, value: unknown) => (typeof value === 'number' ? rounded(value) : value)))
}

/** Four significant digits: more than a shared machine can repeat. */
function rounded(value: number): number {
  return Number(value.toPrecision(4))
}
