// The lazily loaded group of what is known about worms, media and produce: facts and judgements for the forms, and
// the parts of a listing's page that need them. It holds no form library and no contract parser, so that a buyer of
// lettuce loads neither; the forms take it in as `Goods`.
export { cropChoices, usualCrops, whyNoCrop } from './goods/crop-choices'
export { lotIssues } from './goods/lot-issues'
export { produceNotes } from './goods/produce-notes'
export { mediaNotes, wormNotes } from './goods/supply-notes'
export { findCrop } from '@/shared/domain/produce/find-crop'
export { mediaMaterials } from '@/shared/domain/media/media.facts'
export { supplyCautions } from '@/components/supplies/supply-cautions'
export { supplyFacts } from '@/components/supplies/supply-facts'
export { wormKinds } from '@/shared/domain/worms/worms.facts'
