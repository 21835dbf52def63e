import { useEffect, useRef } from 'react'

import { pan, zoom, type MapView, type Point, type Size } from './map-view'

import type { WebKeyEvent } from '@/components/ui/web-key-event'
import type { View } from 'react-native'

interface Gestures {
  view: MapView
  size: Size
  onMove: (view: MapView) => void
  onMoveEnd: (view: MapView) => void
}

const keyStepPx = 80
const keySteps: Record<string, Point> = {
  ArrowLeft: { x: keyStepPx, y: 0 },
  ArrowRight: { x: -keyStepPx, y: 0 },
  ArrowUp: { x: 0, y: keyStepPx },
  ArrowDown: { x: 0, y: -keyStepPx },
}
const keyZooms: Record<string, number> = { '+': 2, '=': 2, '-': 0.5 }
const wheelRestMs = 250
const dragPx = 4

/** Drag, pinch, wheel and keys. Listens on the element itself: React's wheel listener cannot stop the page. */
export function useMapGestures(surface: View | null, gestures: Gestures) {
  const latest = useRef(gestures)
  useEffect(() => {
    latest.current = gestures
  })

  useEffect(() => {
    if (surface) return listen(surface as unknown as HTMLElement, latest)
  }, [surface])

  function onKeyDown(event: WebKeyEvent) {
    const { key } = event.nativeEvent
    const { view, onMove, onMoveEnd } = gestures
    const step = keySteps[key]
    const factor = keyZooms[key]
    const moved = step ? pan(view, step) : factor ? zoom(view, factor) : null
    if (!moved) return
    event.preventDefault()
    onMove(moved)
    onMoveEnd(moved)
  }
  return onKeyDown
}

function listen(element: HTMLElement, latest: { current: Gestures }) {
  const fingers = new Map<number, Point>()
  let hasMoved = false
  let wheelRest: ReturnType<typeof setTimeout> | undefined

  const move = (view: MapView) => {
    latest.current = { ...latest.current, view }
    latest.current.onMove(view)
  }
  const fromMiddle = (at: Point): Point => {
    const box = element.getBoundingClientRect()
    return { x: at.x - box.left - box.width / 2, y: at.y - box.top - box.height / 2 }
  }
  const onDown = (event: PointerEvent) => {
    fingers.set(event.pointerId, { x: event.clientX, y: event.clientY })
    if (fingers.size === 1) hasMoved = false
  }
  const onPointerMove = (event: PointerEvent) => {
    const before = fingers.get(event.pointerId)
    if (!before) return
    const now = { x: event.clientX, y: event.clientY }
    if (!hasMoved && Math.hypot(now.x - before.x, now.y - before.y) < dragPx) return
    if (!hasMoved) element.setPointerCapture(event.pointerId)
    hasMoved = true
    const other = [...fingers].find(([id]) => id !== event.pointerId)?.[1]
    const { view } = latest.current
    if (other) {
      const factor =
        Math.hypot(now.x - other.x, now.y - other.y) / Math.hypot(before.x - other.x, before.y - other.y)
      move(zoom(view, factor, fromMiddle({ x: (now.x + other.x) / 2, y: (now.y + other.y) / 2 })))
    } else move(pan(view, { x: now.x - before.x, y: now.y - before.y }))
    fingers.set(event.pointerId, now)
  }
  const onUp = (event: PointerEvent) => {
    const wasDown = fingers.delete(event.pointerId)
    if (wasDown && hasMoved && fingers.size === 0) latest.current.onMoveEnd(latest.current.view)
  }
  // A drag that ends over a pin is not a press of the pin.
  const onClick = (event: MouseEvent) => {
    if (hasMoved) event.stopPropagation()
    hasMoved = false
  }
  const onWheel = (event: WheelEvent) => {
    event.preventDefault()
    move(
      zoom(
        latest.current.view,
        2 ** (-event.deltaY / 240),
        fromMiddle({ x: event.clientX, y: event.clientY }),
      ),
    )
    clearTimeout(wheelRest)
    wheelRest = setTimeout(() => latest.current.onMoveEnd(latest.current.view), wheelRestMs)
  }

  element.style.touchAction = 'none'
  const stop = new AbortController()
  const { signal } = stop
  element.addEventListener('pointerdown', onDown, { signal })
  element.addEventListener('pointermove', onPointerMove, { signal })
  element.addEventListener('pointerup', onUp, { signal })
  element.addEventListener('pointercancel', onUp, { signal })
  element.addEventListener('click', onClick, { signal, capture: true })
  element.addEventListener('wheel', onWheel, { signal, passive: false })
  return () => {
    clearTimeout(wheelRest)
    stop.abort()
  }
}
