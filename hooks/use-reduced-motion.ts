import { useEffect, useState } from 'react'
import { AccessibilityInfo } from 'react-native'

// CSS motion is stopped in public/global.css; this is for motion that script drives.
export function useReducedMotion(): boolean {
  const [isReduced, setIsReduced] = useState(false)
  useEffect(() => {
    void AccessibilityInfo.isReduceMotionEnabled().then(setIsReduced)
    const listener = AccessibilityInfo.addEventListener('reduceMotionChanged', setIsReduced)
    return () => listener.remove()
  }, [])
  return isReduced
}
