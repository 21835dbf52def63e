import { wormKinds, type WormKind } from '@/shared/domain/worms/worms.facts'

/** null: not an animal of the category of worms. */
export function findWormKind(taxonId: string): WormKind | null {
  return wormKinds.find((kind) => kind.taxonId === taxonId) ?? null
}
