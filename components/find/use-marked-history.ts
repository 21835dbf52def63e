import { useIsFocused } from 'expo-router'
import { useEffect, useEffectEvent } from 'react'

import type { Params } from './find-params'

const ownPath = '/'
let markedId: unknown

const entryId = (state: unknown): unknown =>
  typeof state === 'object' && state !== null && 'id' in state ? state.id : undefined

/**
 * Lets the browser's way back undo one filter at a time. The router replaces the address when only the parameters of
 * a place change, so a copy of the present entry is left behind before each change, with the router's own state.
 * Moves between such copies are answered here, before the router would draw the whole app anew for them.
 */
export function useMarkedHistory(onReturn: (params: Params) => void): () => void {
  const isInView = useIsFocused()
  const answer = useEffectEvent((event: PopStateEvent) => {
    const isOwn = isInView && window.location.pathname === ownPath && markedId !== undefined
    if (!isOwn || entryId(event.state) !== markedId) return
    event.stopImmediatePropagation()
    onReturn(Object.fromEntries(new URLSearchParams(window.location.search)))
  })
  useEffect(() => {
    const onMove = (event: PopStateEvent) => answer(event)
    window.addEventListener('popstate', onMove, { capture: true })
    return () => window.removeEventListener('popstate', onMove, { capture: true })
  }, [])
  return markHere
}

function markHere() {
  markedId = entryId(window.history.state)
  window.history.pushState(window.history.state, '', window.location.href)
}
