import { reasonTexts, type ReasonCode } from '@/shared/domain/transport/reason-texts.facts'

interface Kept {
  code: string
}

const isKnown = (code: string): code is ReasonCode => Object.hasOwn(reasonTexts, code)

/** Reasons of a kept check as sentences, strictest first, each once. A code that was since renamed is left out. */
export function reasonSentences(reasons: readonly Kept[]): string[] {
  const codes = [...new Set(reasons.map(({ code }) => code))]
  return codes.filter(isKnown).map((code) => reasonTexts[code].text)
}
