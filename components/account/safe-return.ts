import type { Href } from 'expo-router'

const here = 'https://here.invalid'

/** Where to go after signing in: a path of our own, or Find for anything that would leave the site. */
export function safeReturn(given: string | string[] | undefined): Href {
  const path = Array.isArray(given) ? given[0] : given
  if (!path || !path.startsWith('/') || /[\\\u0000-\u001f]/u.test(path)) return '/'
  try {
    const { origin, pathname, search } = new URL(path, here)
    // "/..//elsewhere" is ours as written, and becomes "//elsewhere" once its dots are gone.
    return origin === here && !pathname.startsWith('//') ? (`${pathname}${search}` as Href) : '/'
  } catch {
    return '/'
  }
}
