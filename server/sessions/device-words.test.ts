import { describe, expect, it } from 'vitest'

import { deviceWords } from '@/server/sessions/device-words'

// Shapes of the headers from memory, shortened where it changes nothing.
const agents: [string, string | null][] = [
  ['Firefox on Windows', 'Mozilla/5.0 (Windows NT 10.0; Win64; x64; rv:128.0) Gecko/20100101 Firefox/128.0'],
  [
    'Edge on Windows',
    'Mozilla/5.0 (Windows NT 10.0) AppleWebKit/537.36 Chrome/126.0 Safari/537.36 Edg/126.0',
  ],
  [
    'Chrome on Android',
    'Mozilla/5.0 (Linux; Android 14; K) AppleWebKit/537.36 Chrome/126.0 Mobile Safari/537.36',
  ],
  ['Safari on iPhone', 'Mozilla/5.0 (iPhone; CPU iPhone OS 17_5 like Mac OS X) Version/17.5 Safari/604.1'],
  ['Chrome on iPhone', 'Mozilla/5.0 (iPhone; CPU iPhone OS 17_5 like Mac OS X) CriOS/126.0 Safari/604.1'],
  ['Safari on Mac', 'Mozilla/5.0 (Macintosh; Intel Mac OS X 10_15_7) Version/17.5 Safari/605.1.15'],
  ['Chrome on ChromeOS', 'Mozilla/5.0 (X11; CrOS x86_64 14541.0.0) Chrome/126.0 Safari/537.36'],
  ['An app on Android', 'Tankward/1 (Android 14)'],
  ['An unknown device', 'curl/8.0'],
  ['An unknown device', '<script>alert(1)</script>'],
  ['An unknown device', null],
]

describe('the name of a device', () => {
  it.each(agents)('%s', (words, agent) => expect(deviceWords(agent)).toBe(words))
})
