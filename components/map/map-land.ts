import { geoCentroid, geoMercator, geoPath } from 'd3-geo'
import { feature, mesh } from 'topojson-client'
import atlas from 'us-atlas/states-10m.json'

import type { LatLng } from './map.types'
import type { FeatureCollection, Geometry } from 'geojson'
import type { GeometryCollection, Topology } from 'topojson-specification'

type Atlas = Topology<{ states: GeometryCollection<{ name: string }>; nation: GeometryCollection }>

// Drawn once at this scale; panning and zooming only change the transform of the group around it.
export const landScale = 20_000

const topology = atlas as unknown as Atlas
const draw = geoPath(geoMercator().scale(landScale).translate([0, 0])).digits(1)

/** Outline of the country and the lines between its states, as SVG paths (US Census shapes by way of us-atlas). */
export const landPath = draw(feature(topology, topology.objects.nation)) ?? ''
export const borderPath = draw(mesh(topology, topology.objects.states, (a, b) => a !== b)) ?? ''

const states: FeatureCollection<Geometry, { name: string }> = feature(topology, topology.objects.states)

export const stateNames: readonly (LatLng & { name: string })[] = states.features.map((state) => {
  const [lng, lat] = geoCentroid(state)
  return { name: state.properties.name, lat, lng }
})
