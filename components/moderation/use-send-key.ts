import { useEffect, useEffectEvent } from 'react'

/** Ctrl or Cmd with Enter, also while somebody writes: text fields keep their keys to themselves, so it is caught first. */
export function useSendKey(send: () => void) {
  const press = useEffectEvent((event: KeyboardEvent) => {
    if (event.key !== 'Enter' || !(event.ctrlKey || event.metaKey)) return
    event.preventDefault()
    send()
  })
  useEffect(() => {
    window.addEventListener('keydown', press, true)
    return () => window.removeEventListener('keydown', press, true)
  }, [])
}
