import { normalsAt } from '@/shared/domain/climate/climate-grid'
import type { MonthNormals } from '@/shared/domain/climate/month-normals'
import { celsiusFromF } from '@/shared/units/temperature'
import { shippedClimate } from '@/scripts/calc/climate-commands'
import type { Check } from './check'

type Place = readonly [lat: number, lng: number]
/** January, April, July, October. */
type Quarters = readonly [number, number, number, number]

// Normal daily minimum, °F, NOAA Comparative Climatic Data 1981-2010, printed with one decimal. Places of the airports.
const minima: readonly (readonly [station: string, at: Place, Quarters])[] = [
  ['Birmingham AL', [33.563, -86.753], [33.8, 50.5, 71.4, 52.9]],
  ['Huntsville AL', [34.644, -86.786], [31.8, 50, 70.4, 51]],
  ['Mobile AL', [30.688, -88.246], [40.4, 56.7, 73.7, 59.1]],
  ['Montgomery AL', [32.3, -86.394], [35.7, 51.6, 71.5, 53.7]],
  ['Anchorage AK', [61.169, -150.028], [11.1, 29.1, 52.2, 29.1]],
  ['Bethel AK', [60.785, -161.829], [0.8, 19.3, 48.8, 24.7]],
  ['Bettles AK', [66.916, -151.509], [-17.9, 12.3, 49.6, 12.1]],
  ['Big Delta AK', [63.995, -145.721], [-7.8, 22.2, 51.2, 17.5]],
  ['Cold Bay AK', [55.221, -162.732], [23.6, 29, 46.4, 35.4]],
  ['Fairbanks AK', [64.804, -147.876], [-16.9, 20.6, 52.3, 16.5]],
  ['Gulkana AK', [62.159, -145.453], [-10.7, 20.4, 46.5, 18.4]],
  ['Homer AK', [59.642, -151.491], [18.8, 29.8, 48, 31.6]],
  ['Juneau AK', [58.357, -134.564], [23.7, 33.3, 50, 37.8]],
  ['King Salmon AK', [58.677, -156.649], [8.8, 25, 47.3, 25.7]],
  ['Kodiak AK', [57.751, -152.486], [25.9, 32.5, 49.2, 34.5]],
]

// Usual January, °C, NOAA 1991-2020.
const januaries: readonly (readonly [station: string, at: Place, minC: number, maxC: number])[] = [
  ['Minneapolis airport', [44.883, -93.229], -12.9, -4.7],
  ['Phoenix airport', [33.428, -112.004], 7.8, 19.8],
  ['Seattle-Tacoma airport', [47.444, -122.314], 3.2, 8.9],
]

// Standard deviation of the daily value about the daily normal, °C, NOAA 1991-2020: minimum, maximum.
const spreads: readonly (readonly [station: string, at: Place, Quarters, Quarters])[] = [
  ['Fairbanks AK', [64.86, -147.83], [9.6, 5.3, 2.7, 5.5], [9.9, 5.8, 4.2, 5.5]],
  ['Duluth MN', [46.837, -92.183], [8.3, 4.2, 3.3, 4.4], [6.7, 5.9, 4.0, 5.5]],
  ['Minneapolis MN', [44.883, -93.229], [7.4, 4.7, 3.2, 4.6], [6.6, 6.3, 3.6, 5.9]],
  ['Burlington VT', [44.468, -73.15], [7.6, 4.4, 3.3, 4.6], [6.6, 5.8, 3.6, 4.9]],
  ['Boston MA', [42.36, -71.01], [5.4, 3.1, 2.6, 3.6], [5.7, 5.6, 4.2, 4.3]],
  ['Chicago IL', [41.79, -87.75], [6.7, 4.3, 3.3, 4.6], [6.1, 6.2, 3.6, 5.3]],
  ['Concordia KS', [39.55, -97.65], [5.8, 5.0, 3.0, 4.8], [7.6, 6.6, 4.1, 6.0]],
  ['Denver CO', [39.77, -104.87], [5.8, 4.0, 2.4, 4.5], [7.1, 6.8, 3.9, 7.0]],
  ['Salt Lake City UT', [40.778, -111.969], [4.9, 3.7, 3.3, 3.7], [4.9, 5.4, 3.5, 5.3]],
  ['Atlanta GA', [33.63, -84.44], [5.5, 4.2, 1.6, 4.2], [5.6, 4.4, 2.6, 4.1]],
  ['Raleigh NC', [35.87, -78.79], [5.5, 4.8, 2.2, 4.7], [6.2, 5.1, 3.0, 4.4]],
  ['Corpus Christi TX', [27.77, -97.51], [5.5, 4.2, 1.3, 4.1], [6.0, 3.2, 1.6, 3.2]],
  ['Gainesville FL', [29.69, -82.27], [6.1, 4.6, 1.3, 4.3], [4.9, 3.4, 2.0, 3.2]],
  ['Fort Lauderdale FL', [26.07, -80.15], [4.9, 2.9, 1.4, 2.3], [3.1, 2.3, 1.5, 1.7]],
  ['Phoenix AZ', [33.428, -112.004], [2.9, 3.0, 2.6, 3.0], [3.7, 4.4, 2.7, 4.0]],
  ['Davis CA', [38.535, -121.776], [3.3, 2.8, 2.4, 2.9], [3.4, 4.6, 3.6, 4.4]],
  ['Seattle WA', [47.444, -122.314], [3.5, 2.3, 1.8, 2.5], [3.3, 3.8, 4.1, 3.1]],
  ['Honolulu HI', [21.314, -157.847], [2.1, 1.7, 1.3, 1.6], [1.4, 1.3, 0.9, 1.1]],
]

/** The table was moved from 1981-2010 towards 1991-2020 by this much. */
const DRIFT_MIN_C = 0.5
const quarters = [0, 3, 6, 9]
const names = ['January', 'April', 'July', 'October']

const at = ([lat, lng]: Place, kind: keyof MonthNormals, month: number) =>
  normalsAt(shippedClimate(), lat, lng)?.[kind][month] ?? null

const minimum: readonly Check[] = minima.flatMap(([station, place, cells]) =>
  quarters.map((month, index) => ({
    what: `minimum of 1981-2010, ${station}, ${names[index]}`,
    published: celsiusFromF(cells[index] ?? NaN),
    ours: () => {
      const minC = at(place, 'minC', month)
      return minC === null ? null : minC - DRIFT_MIN_C
    },
    within: 4.3,
    because: 'the 99th percentile of the error at held-out stations; the grid knows no hollow and no coast',
    from: 'NOAA Comparative Climatic Data, normal daily minimum',
  })),
)

const january: readonly Check[] = januaries.flatMap(([station, place, minC, maxC]) => [
  {
    what: `usual January minimum, ${station}`,
    published: minC,
    ours: () => at(place, 'minC', 0),
    within: 2.9,
    because: 'the 95th percentile of the error at held-out stations',
    from: 'NOAA normals 1991-2020',
  },
  {
    what: `usual January maximum, ${station}`,
    published: maxC,
    ours: () => at(place, 'maxC', 0),
    within: 2.8,
    because: 'the 95th percentile of the error at held-out stations',
    from: 'NOAA normals 1991-2020',
  },
])

const spread: readonly Check[] = spreads.flatMap(([station, place, min, max]) =>
  quarters.flatMap((month, index) =>
    (
      [
        ['sdMinC', min],
        ['sdMaxC', max],
      ] as const
    ).map(([kind, cells]) => ({
      what: `${kind}, ${station}, ${names[index]}`,
      published: cells[index] ?? NaN,
      ours: () => at(place, kind, month),
      within: 1.7,
      because: 'the 95th percentile of the regression that the table is half made of',
      from: 'NOAA normals 1991-2020, standard deviation of the daily value',
    })),
  ),
)

export const climateChecks: readonly Check[] = [...minimum, ...january, ...spread]
