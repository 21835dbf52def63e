import { useEffect, useState } from 'react'

/** The value as it was once it has not changed for so long. */
export function useSettled<T>(value: T, restMs: number): T {
  const [settled, setSettled] = useState(value)
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), restMs)
    return () => clearTimeout(timer)
  }, [value, restMs])
  return settled
}
