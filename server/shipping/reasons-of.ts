import { reasonSentences } from '@/shared/domain/shipping/reason-sentences'

const NO_FIGURES =
  'We hold no figures for these animals or for the weather on this way, so nobody can say that they survive it.'

/** Why a way is not safe, in sentences; empty when it is. */
export function reasonsOf({ verdict, reasons }: { verdict: string; reasons: { code: string }[] }): string[] {
  const said = verdict === 'safe' ? [] : reasonSentences(reasons)
  return verdict === 'unknown' && said.length === 0 ? [NO_FIGURES] : said
}
