import { onlineManager } from '@tanstack/react-query'
import { useSyncExternalStore } from 'react'

/** Whether the device believes it has a connection; requests wait while it does not. */
export function useOnline(): boolean {
  return useSyncExternalStore(
    (tell) => onlineManager.subscribe(tell),
    () => onlineManager.isOnline(),
    () => true,
  )
}
