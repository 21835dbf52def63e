import { useEffect, useEffectEvent } from 'react'

export type DeskKeys = Record<string, (() => void) | undefined>

const typingTags = ['INPUT', 'TEXTAREA', 'SELECT']

/** Single keys of the desk. They rest while somebody types, with a modifier held, and while `isOn` is false. */
export function useDeskKeys(keys: DeskKeys, isOn: boolean) {
  const press = useEffectEvent((event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey || event.defaultPrevented) return
    const at = event.target
    if (at instanceof HTMLElement && (typingTags.includes(at.tagName) || at.isContentEditable)) return
    const act = keys[event.key]
    if (!act) return
    event.preventDefault()
    act()
  })
  useEffect(() => {
    if (!isOn) return
    window.addEventListener('keydown', press)
    return () => window.removeEventListener('keydown', press)
  }, [isOn])
}
