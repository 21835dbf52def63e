type Place = readonly [lat: number, lng: number]

/** Two lines of the published GeographicLib test set: both ends and the metres between them. */
export const geodesicTestLines: readonly (readonly [from: Place, to: Place, metres: number])[] = [
  [[-19.79938, -174.47484], [-11.99349, -154.35109], 2_319_004.860117],
  [[55.52454, 106.05087], [77.03196, 197.18234 - 360], 4_105_086.171392],
]
