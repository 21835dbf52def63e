import { geoCircle } from 'd3-geo'

import { borderPath, landPath, landScale, stateNames } from './map-land'
import { earthRadiusKm, toScreen, toWorld, type MapView, type Size } from './map-view'
import { placeNames } from './place-names'

import { color, font } from '@/constants/theme'

import type { MapArea, MapTown } from './map.types'

interface Props {
  view: MapView
  size: Size
  area: MapArea
  towns?: readonly MapTown[]
}

export function MapDrawing({ view, size, area, towns = [] }: Props) {
  const middle = toWorld(view.center)
  const factor = view.scale / landScale
  const move = `translate(${size.widthPx / 2 - middle.x * view.scale} ${size.heightPx / 2 - middle.y * view.scale})`
  return (
    <svg
      width={size.widthPx}
      height={size.heightPx}
      aria-hidden
      focusable={false}
      style={{ display: 'block' }}
    >
      <g transform={`${move} scale(${factor})`} strokeLinejoin="round">
        <path
          d={landPath}
          fill={color.card}
          stroke={color.edge}
          strokeWidth={1}
          vectorEffect="non-scaling-stroke"
        />
        <path
          d={borderPath}
          fill="none"
          stroke={color.edge}
          strokeWidth={1}
          strokeDasharray="6 4"
          vectorEffect="non-scaling-stroke"
        />
      </g>
      <polygon
        points={circlePoints(area, view, size)}
        fill={color.netting}
        fillOpacity={0.07}
        stroke={color.netting}
        strokeWidth={1.5}
      />
      <Names places={stateNames} view={view} size={size} isState />
      <Names places={towns} view={view} size={size} />
    </svg>
  )
}

function circlePoints({ center, radiusKm }: MapArea, view: MapView, size: Size): string {
  const radiusDegrees = ((radiusKm / earthRadiusKm) * 180) / Math.PI
  const ring =
    geoCircle().center([center.lng, center.lat]).radius(radiusDegrees).precision(4)().coordinates[0] ?? []
  return ring
    .map(([lng = 0, lat = 0]) => toScreen(view, size, { lat, lng }))
    .map(({ x, y }) => `${x.toFixed(1)},${y.toFixed(1)}`)
    .join(' ')
}

interface NamesProps {
  places: readonly MapTown[]
  view: MapView
  size: Size
  isState?: boolean
}

const letterings = {
  state: { fontPx: 15, letterSpacingPx: 2 },
  town: { fontPx: 13, letterSpacingPx: 0 },
} as const

function Names({ places, view, size, isState }: NamesProps) {
  const lettering = letterings[isState ? 'state' : 'town']
  const seen = places.map(({ name, ...place }) => ({ name, ...toScreen(view, size, place) }))
  return placeNames(seen, size, lettering).map(({ name, x, y }) => (
    <g key={name} transform={`translate(${x.toFixed(1)} ${y.toFixed(1)})`}>
      {isState ? null : <circle r={2.5} fill={color.muted} />}
      <text
        y={isState ? 0 : -7}
        textAnchor="middle"
        fontFamily={font.body.fontFamily}
        fontSize={lettering.fontPx}
        letterSpacing={lettering.letterSpacingPx}
        fill={color.muted}
        stroke={color.card}
        strokeWidth={3}
        paintOrder="stroke"
      >
        {name}
      </text>
    </g>
  ))
}
