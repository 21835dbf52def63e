export type ContactKind = 'phone' | 'mail' | 'link' | 'street' | 'handle'

// A net for the moderator, not a wall: whoever writes numbers as words gets past it, and some farm talk is caught.
// Every repetition is bounded, so that no text makes them slow.
const signs: readonly (readonly [ContactKind, RegExp])[] = [
  ['phone', /(?<!\d)(?:\d[\s().-]{0,2}){9,10}\d(?!\d)/],
  ['mail', /[\w.+-]{1,64}\s?(?:@|\(at\)|\bat\b)\s?[\w-]{1,64}\s?(?:\.|\bdot\b)\s?[a-z]{2,10}\b/i],
  ['link', /https?:|www\.|\b[a-z0-9-]{2,40}\.(?:com|net|org|us|io|biz|info|shop|store|farm|fish|me|co)\b/i],
  [
    'street',
    /\b\d{1,6}\s(?:[NSEW]\.?\s)?(?:[A-Z][\w'-]{1,20}\s){1,4}(?:Street|St|Road|Rd|Avenue|Ave|Lane|Ln|Drive|Dr|Court|Ct|Pike|Highway|Hwy|Boulevard|Blvd|Way|Trail|Route)\b/,
  ],
  ['handle', /(?:^|\s)[@$][a-z_]\w{2,29}\b|\b(?:text|call|message|whisper)\s(?:me|us)\b|\bcash only\b/i],
]

/** Which ways around the site a text seems to offer, each kind once. Empty: none seen. */
export function contactInText(text: string): ContactKind[] {
  return signs.filter(([, sign]) => sign.test(text)).map(([kind]) => kind)
}
