import { mediaMaterials, type MediaMaterial } from '@/shared/domain/media/media.facts'

/** null: not a material of ours. */
export function findMedia(id: string): MediaMaterial | null {
  return mediaMaterials.find((material) => material.id === id) ?? null
}
