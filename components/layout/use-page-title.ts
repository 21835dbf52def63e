import { useEffect } from 'react'

/** Names the browser tab after the page in view. The router's own Head does it too, for 12 KB of script. */
export function usePageTitle(title: string, isInView: boolean) {
  useEffect(() => {
    if (isInView) document.title = `${title} · Tankward`
  }, [title, isInView])
}
