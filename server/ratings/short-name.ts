/** How a buyer is named in public: "Bea Kowalski" → "Bea K."; one name alone stays. */
export function shortName(name: string): string {
  const [first = '', ...others] = name.trim().split(/\s+/u)
  const last = others.at(-1)
  const initial = last ? [...last][0]?.toLocaleUpperCase('en-US') : undefined
  return initial ? `${first} ${initial}.` : first
}
