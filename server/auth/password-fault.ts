export const LEAST_PASSWORD = 12
export const MOST_PASSWORD = 128

// Words that stand at the head of every list of leaked passwords, and our own trade's obvious ones. From memory.
const COMMON = (
  'password passwort letmein welcome admin administrator qwerty qwertyuiop asdfgh asdfghjkl zxcvbn zxcvbnm iloveyou ' +
  'monkey dragon master sunshine princess football baseball basketball superman batman trustno shadow michael jordan ' +
  'jennifer hunter killer soccer charlie summer winter autumn spring flower cheese computer internet secret login ' +
  'starwars pokemon freedom whatever mustang corvette hello access buster ginger pepper maggie cookie chocolate ' +
  'changeme default test testing user guest root pass love angel baby lovely family friends happy money ' +
  'tankward fish fishtank tilapia catfish aquaponics hatchery fingerling grower garden lettuce abc xyz one two three'
).split(' ')
const ROWS = [
  '01234567890123456789',
  '98765432109876543210',
  'abcdefghijklmnopqrstuvwxyz',
  'qwertyuiopasdfghjklzxcvbnm',
]
const LOOKALIKES: Record<string, string> = {
  '@': 'a',
  '4': 'a',
  '3': 'e',
  '1': 'i',
  '!': 'i',
  '0': 'o',
  $: 's',
  '5': 's',
  '7': 't',
}

function withoutCommonWords(text: string): string {
  let rest = text
  for (const word of [...COMMON].sort((a, b) => b.length - a.length)) rest = rest.split(word).join('')
  return rest
}

/** A sentence saying what is wrong with a password, or null. No rule about kinds of characters: length does it. */
export function passwordFault(password: string, email: string): string | null {
  if (password.length < LEAST_PASSWORD)
    return `At least ${LEAST_PASSWORD} characters. A few words in a row are fine.`
  if (password.length > MOST_PASSWORD) return `At most ${MOST_PASSWORD} characters.`
  const lower = password.toLowerCase()
  if (new Set(lower).size < 5) return 'Too few different characters: that is guessed in seconds.'
  const own = email.toLowerCase().split('@')[0] ?? ''
  if (own.length >= 5 && lower.includes(own)) return 'It holds your e-mail name: choose something unrelated.'
  if (ROWS.some((row) => row.includes(lower.slice(0, 10))))
    return 'A row of keys or digits is tried first by everyone.'
  // The usual "1234" or "2026!" at the end adds nothing; inside, 0 stands for o.
  const letters = [...lower.replace(/[^a-z]+$/, '')]
    .map((character) => LOOKALIKES[character] ?? character)
    .join('')
  const plain = withoutCommonWords(lower).replace(/[^a-z]/g, '')
  const undisguised = withoutCommonWords(letters).replace(/[^a-z]/g, '')
  if (Math.min(plain.length, undisguised.length) < 3) {
    return 'That is one of the passwords tried first everywhere. Three or four unrelated words make a good one.'
  }
  return null
}
