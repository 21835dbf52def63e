import type { Params } from './find-params'

/** Apps have no address bar: the way back leaves the screen. */
export function useMarkedHistory(_onReturn: (params: Params) => void): () => void {
  return () => undefined
}
