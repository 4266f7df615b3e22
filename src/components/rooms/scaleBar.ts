const FEET_STEPS = [1, 2, 5, 10, 20, 50, 100, 200, 500, 1000]

/** The longest round number of feet whose bar takes up no more than the given pixels; at least a foot. */
export function scaleBar(pixelsPerInch: number, maxPixels: number): { feet: number; pixels: number } {
  const fitting = FEET_STEPS.filter((feet) => feet * 12 * pixelsPerInch <= maxPixels)
  const feet = fitting.at(-1) ?? 1
  return { feet, pixels: feet * 12 * pixelsPerInch }
}
