/**
 * How much longer a slope is than its plan: √(1 + (rise / run)²). A roof of 6 in 12 → 1.1180, so a plan of 5,000 sq ft carries 5,590 sq ft of roof.
 * Pythagoras on the common rafter; roofing tables print the same factor.
 */
export function slopeFactor(rise: number, run: number): number {
  return Math.sqrt(1 + (rise / run) ** 2)
}
