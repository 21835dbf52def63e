import { geodesicM, sphereM } from '@/shared/domain/geo/geodesic'
import { geodesicTestLines } from './geodesic-test-lines'
import { checksOf, type Check } from './check'

type Place = readonly [lat: number, lng: number]
const at = ([lat, lng]: Place) => ({ lat, lng })
const dms = (degrees: number, minutes: number, seconds: number) => degrees + minutes / 60 + seconds / 3600

const flinders: Place = [-dms(37, 57, 3.7203), dms(144, 25, 29.5244)]
const buninyong: Place = [-dms(37, 39, 10.1561), dms(143, 55, 35.3839)]
const zips: Readonly<Record<string, Place>> = {
  '10001': [40.75065, -73.997293],
  '37067': [35.912202, -86.768842],
  '37214': [36.169038, -86.662565],
  '54115': [44.405368, -88.08935],
  '54301': [44.480778, -88.016063],
  '60601': [41.885155, -87.621512],
  '60614': [41.922747, -87.647153],
  '94103': [37.772983, -122.411343],
  '95814': [38.580568, -121.49559],
}
const zipPairs = [
  ['54301-54115', 10_210.6, 10_206.0],
  ['37214-37067', 30_064.7, 30_115.1],
  ['60601-60614', 4_686.2, 4_687.8],
  ['94103-95814', 120_306.5, 120_296.0],
  ['10001-94103', 4_138_422.7, 4_128_369.4],
] as const

const pairOf = (key: string): [Place, Place] => {
  const [from = '', to = ''] = key.split('-')
  return [zips[from] ?? [NaN, NaN], zips[to] ?? [NaN, NaN]]
}
const geodesic = ([from, to]: readonly [Place, Place]) => geodesicM(at(from), at(to))
const sphere = ([from, to]: readonly [Place, Place]) => sphereM(at(from), at(to))
const one = (what: string, published: number) => [[what, what, published]] as const

export const distanceChecks: readonly Check[] = [
  ...checksOf(
    {
      from: 'Geoscience Australia test line (GRS 80)',
      within: 0.001,
      because: 'millimetres printed; GRS 80 and WGS 84 differ by less',
    },
    one('Flinders Peak to Buninyong', 54_972.271),
    () => geodesic([flinders, buninyong]),
  ),
  ...checksOf(
    { from: 'the same line on the sphere, computed', within: 0.001, because: 'millimetres printed' },
    one('Flinders Peak to Buninyong, sphere', 54_925.508),
    () => sphere([flinders, buninyong]),
  ),
  ...checksOf(
    { from: 'GeographicLib, computed', within: 0.5, because: 'whole metres printed' },
    one('Nashville to Los Angeles, WGS 84', 2_892_777),
    () =>
      geodesic([
        [36.12, -86.67],
        [33.94, -118.4],
      ]),
  ),
  ...checksOf(
    {
      from: 'worked example on a sphere of 6,372.8 km',
      within: 0.1,
      because: 'decimetres printed; angle taken from our sphere',
    },
    one('Nashville to Los Angeles, haversine', 2_887_260.0),
    () =>
      ((sphere([
        [36.12, -86.67],
        [33.94, -118.4],
      ]) ?? NaN) /
        6_371_008.8) *
      6_372_800,
  ),
  ...checksOf(
    { from: 'GeographicLib example output', within: 0.001, because: 'millimetres printed' },
    one('Wellington to Salamanca, almost antipodes', 19_959_679.267),
    () =>
      geodesic([
        [-41.32, 174.81],
        [40.96, -5.5],
      ]),
  ),
  ...checksOf(
    { from: 'ellipsoid geometry', within: 0.001, because: 'millimetres printed' },
    one('a degree of the equator, WGS 84', 111_319.491),
    () =>
      geodesic([
        [0, 0],
        [0, 1],
      ]),
  ),
  ...checksOf(
    { from: 'sphere geometry', within: 0.001, because: 'millimetres printed' },
    one('a degree of the equator, sphere', 111_195.08),
    () =>
      sphere([
        [0, 0],
        [0, 1],
      ]),
  ),
  ...checksOf(
    { from: 'ellipsoid geometry', within: 0.001, because: 'millimetres printed' },
    one('quarter of the meridian', 10_001_965.729),
    () =>
      geodesic([
        [0, 0],
        [90, 0],
      ]),
  ),
  ...geodesicTestLines.map(([from, to, published]) => ({
    what: `test line ${from.join(', ')} to ${to.join(', ')}`,
    published,
    ours: () => geodesic([from, to]),
    within: 1e-5,
    because: 'micrometres printed, ten of them allowed for rounding',
    from: 'GeographicLib geodesic test set',
  })),
  ...checksOf(
    { from: 'ZIP points, GeographicLib', within: 0.06, because: 'decimetres printed' },
    zipPairs.map(([pair, published]) => [`${pair}, WGS 84`, pair, published] as const),
    (pair) => geodesic(pairOf(pair)),
  ),
  ...checksOf(
    { from: 'ZIP points, haversine', within: 0.06, because: 'decimetres printed' },
    zipPairs.map(([pair, , published]) => [`${pair}, sphere`, pair, published] as const),
    (pair) => sphere(pairOf(pair)),
  ),
]
