import { normalsAt } from '@/shared/domain/climate/climate-grid'
import { celsiusFromF } from '@/shared/units/temperature'
import { shippedClimate } from '@/scripts/calc/climate-commands'
import type { Check } from './check'

/** January, April, July, October, °F. */
type Quarters = readonly [number, number, number, number]

// Normal daily maximum and minimum, °F, NOAA NCEI Comparative Climatic Data, normals 1991-2020 (tables read; public domain).
// The Ohio valley first. Places of the airports, from memory to a hundredth of a degree: less than a fortieth of a cell.
// prettier-ignore
const stations: readonly (readonly [station: string, lat: number, lng: number, max: Quarters, min: Quarters])[] = [
  ['Cincinnati OH', 39.04, -84.67, [39.6, 65.5, 86.0, 66.7], [23.1, 43.7, 65.9, 45.7]],
  ['Columbus OH', 39.99, -82.88, [37.1, 64.1, 85.4, 65.5], [22.0, 42.2, 65.4, 44.8]],
  ['Dayton OH', 39.91, -84.22, [37.1, 64.5, 85.9, 66.2], [21.8, 42.9, 66.1, 45.9]],
  ['Louisville KY', 38.18, -85.74, [43.6, 69.6, 89.0, 70.5], [27.8, 48.5, 70.8, 50.1]],
  ['Lexington KY', 38.04, -84.61, [42.3, 67.2, 86.9, 68.6], [25.4, 45.2, 66.5, 47.0]],
  ['Paducah KY', 37.06, -88.77, [44.7, 70.4, 89.9, 71.8], [27.3, 47.6, 69.4, 47.6]],
  ['Evansville IN', 38.04, -87.53, [41.7, 68.4, 88.6, 70.1], [25.5, 46.1, 68.8, 47.1]],
  ['Indianapolis IN', 39.72, -86.28, [36.1, 63.9, 85.2, 65.6], [20.9, 43.3, 66.4, 45.5]],
  ['Pittsburgh PA', 40.5, -80.23, [36.3, 62.4, 82.9, 63.1], [21.4, 40.7, 63.4, 43.7]],
  ['Nashville TN', 36.12, -86.69, [49.1, 72.6, 90.9, 73.5], [30.1, 48.9, 70.5, 49.9]],
  ['St. Louis MO', 38.75, -90.37, [40.4, 68.0, 89.6, 69.2], [23.8, 47.0, 71.1, 49.1]],
  ['Chicago IL', 41.96, -87.93, [31.6, 59.0, 84.5, 62.7], [18.8, 40.3, 66.4, 45.4]],
  ['Atlanta GA', 33.63, -84.44, [54.0, 73.8, 90.1, 74.4], [35.6, 52.5, 71.8, 54.9]],
  ['Miami FL', 25.79, -80.32, [76.2, 83.6, 90.6, 85.9], [61.0, 69.8, 77.5, 74.2]],
  ['Dallas TX', 32.9, -97.02, [57.7, 77.4, 96.9, 79.5], [37.9, 56.8, 77.7, 58.7]],
  ['Denver CO', 39.85, -104.66, [46.5, 62.5, 90.2, 66.7], [17.6, 33.7, 59.3, 35.7]],
  ['Des Moines IA', 41.53, -93.65, [30.9, 62.0, 85.6, 63.4], [13.8, 40.6, 66.4, 42.9]],
  ['Boston MA', 42.36, -71.01, [36.8, 56.4, 82.1, 62.1], [23.1, 40.8, 66.0, 47.5]],
  ['Fresno CA', 36.78, -119.72, [55.4, 73.7, 97.7, 78.7], [40.6, 50.9, 69.3, 54.6]],
  ['Spokane WA', 47.62, -117.53, [34.5, 56.9, 84.4, 57.7], [24.7, 37.0, 57.6, 38.0]],
  ['Fargo ND', 46.93, -96.81, [18.2, 54.1, 82.1, 55.8], [0.2, 31.9, 59.4, 35.2]],
  ['Boise ID', 43.57, -116.24, [38.8, 62.3, 92.7, 64.8], [25.5, 39.6, 61.9, 41.5]],
]

const quarters = [0, 3, 6, 9]
const names = ['January', 'April', 'July', 'October']

export const normalsChecks: readonly Check[] = stations.flatMap(([station, lat, lng, max, min]) =>
  quarters.flatMap((month, at) => [
    {
      what: `usual maximum, ${station}, ${names[at]}`,
      published: celsiusFromF(max[at] ?? NaN),
      ours: () => normalsAt(shippedClimate(), lat, lng)?.maxC[month] ?? null,
      within: 3.4,
      because: 'the 99th percentile of the error of maxima at held-out stations',
      from: 'NOAA NCEI normals 1991-2020, normal daily maximum',
    },
    {
      what: `usual minimum, ${station}, ${names[at]}`,
      published: celsiusFromF(min[at] ?? NaN),
      ours: () => normalsAt(shippedClimate(), lat, lng)?.minC[month] ?? null,
      within: 4.3,
      because:
        'the 99th percentile of the error of minima at held-out stations: airports are warmer at night',
      from: 'NOAA NCEI normals 1991-2020, normal daily minimum',
    },
  ]),
)
