import type { CellPoint } from '@/shared/domain/geo/location-cell'
import type { Shipment } from '@/shared/domain/season/season-at'
import { seasonBandAt } from '@/shared/domain/season/season-band'
import type { PackingClassId } from '@/shared/domain/season/season-classes.facts'
import { animalClassOf } from '@/shared/domain/season/season-lane'
import { findTaxon } from '@/shared/domain/species/find-taxon'

export interface ShippedBatch {
  taxonId: string
  packing: PackingClassId
  from: CellPoint
}

/** A batch on its way to a place, as the season table knows it. null: an animal that we hold no class for. */
export function shipmentOf({ taxonId, packing, from }: ShippedBatch, to: CellPoint): Shipment | null {
  const speciesId = findTaxon(taxonId)?.speciesId
  const animals = speciesId ? animalClassOf(speciesId) : null
  if (!animals) return null
  const [origin, destination] = [seasonBandAt(from.lat, from.lng), seasonBandAt(to.lat, to.lng)]
  return { origin, destination, animals, packing }
}
