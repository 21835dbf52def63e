const kmPerMile = 1.609344
const steps = [0.1, 0.2, 0.5, 1, 2, 5, 10, 20, 50, 100, 200, 500]
const widestPx = 110

/** The longest round number of miles that fits in 110 pixels, and its width. */
export function scaleBar(kmPerPixel: number): { miles: number; widthPx: number } {
  const widthOf = (miles: number) => (miles * kmPerMile) / kmPerPixel
  const miles = steps.findLast((step) => widthOf(step) <= widestPx) ?? 0.1
  return { miles, widthPx: Math.round(widthOf(miles)) }
}
