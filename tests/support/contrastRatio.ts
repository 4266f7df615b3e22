export type Rgb = [red: number, green: number, blue: number]

/** Contrast of two colours from 1 to 21, after WCAG 2.2 ("contrast ratio" and "relative luminance"). */
export function contrastRatio(one: Rgb, other: Rgb): number {
  const [lighter, darker] = [luminance(one), luminance(other)].sort((a, b) => b - a) as [number, number]
  return (lighter + 0.05) / (darker + 0.05)
}

/** The colour that `part` of `top` makes over `ground`. */
export function mixed(top: Rgb, ground: Rgb, part: number): Rgb {
  return top.map((channel, index) => channel * part + ground[index]! * (1 - part)) as Rgb
}

function luminance(colour: Rgb): number {
  const [red, green, blue] = colour.map((channel) => {
    const share = channel / 255
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4
  }) as Rgb
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue
}
