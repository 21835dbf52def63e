interface TrustedTypes {
  createPolicy: (name: string, rules: { createScriptURL: (url: string) => string }) => unknown
}

declare global {
  interface Window {
    trustedTypes?: TrustedTypes
  }
}

/**
 * The page's policy lets no text become a script address (require-trusted-types-for 'script'), but the loader of
 * lazy chunks writes one. This is the one rule under which it may: our own exported files and nothing else.
 */
export function allowOwnScripts() {
  window.trustedTypes?.createPolicy('default', {
    createScriptURL: (url) => {
      const { origin, pathname } = new URL(url, window.location.href)
      if (origin === window.location.origin && pathname.startsWith('/_expo/static/js/')) return url
      throw new TypeError('Only scripts of this site may be loaded')
    },
  })
}
