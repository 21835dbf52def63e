const ofCrustaceans: readonly [ending: RegExp, one: string, many: string][] = [
  [/crayfish$/, 'crayfish', 'crayfish'],
  [/prawn$/, 'prawn', 'prawns'],
]

/** "fish", "crayfish", "prawns": what a buyer counts. The id says it, so the table of taxa need not load for a word. */
export function animalWord(taxonId: string | undefined, count: number): string {
  const own = ofCrustaceans.find(([ending]) => ending.test(taxonId ?? ''))
  if (!own) return 'fish'
  return count === 1 ? own[1] : own[2]
}
