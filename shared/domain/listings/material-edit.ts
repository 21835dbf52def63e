import { changedFields, flattenBody, type BodyFields } from '@/shared/domain/listings/flatten-body'

/**
 * What an edit of an approved listing does.
 * `hide`: the batch may be another one, or its lawfulness or health another: nothing is sold until a moderator looks.
 * `wait`: words and pictures that nobody has read yet: the approved version stays on sale, the new one waits.
 * `live`: terms of sale, checked by the form alone: at once. Each order keeps the version it was made from, and a
 * buyer who saw another version is told before paying, so even a higher price surprises nobody.
 */
export type EditEffect = 'live' | 'wait' | 'hide'

const hides = [
  'category',
  'taxonId',
  'strain',
  'origin',
  'originState',
  'hatchedOn',
  'wildCaught',
  'singleSpeciesChecked',
  'licenceNumbers',
  'health.treatments',
  'health.lastLosses',
  'health.papers',
  'raisedInUs',
  'material',
  'materialWords',
  'heatTreated',
  'cropId',
  'form',
  'lotCode',
]
const goesLive = [
  'readyOn',
  'countOnHand',
  'minOrder',
  'orderStep',
  'mostPerBuyer',
  'tiers',
  'countMethod',
  'overcountPct',
  'water.temperatureC',
  'water.pH',
  'water.ghPpm',
  'water.khPpm',
  'water.saltPpt',
  'water.source',
  'water.measuredOn',
  'placeKind',
  'windows',
  'accept',
  'balanceDue',
  'depositPct',
  'freeCancelHours',
  'promise.windowHours',
  'promise.survivalDays',
  'promise.remedy',
  'sellBy',
]

/** Serving fewer states can wait for nobody; serving more is read first. */
function servesMore(before: BodyFields, after: BodyFields): boolean {
  const was = flattenBody(before).get('statesServed')
  const is = flattenBody(after).get('statesServed')
  return !Array.isArray(was) || !Array.isArray(is) || is.some((state) => !was.includes(state))
}

/** Another way of shipping may be another fate on the way; that nothing is shipped any more can wait for nobody. */
const effectOfShipping = (after: BodyFields): EditEffect => (after['shipping'] ? 'hide' : 'live')

/** Everything not named above, and whatever field is added later, is read by a moderator first. */
export function effectOfField(field: string, before: BodyFields, after: BodyFields): EditEffect {
  if (hides.includes(field)) return 'hide'
  if (field === 'statesServed') return servesMore(before, after) ? 'wait' : 'live'
  if (field.startsWith('shipping.')) return effectOfShipping(after)
  return goesLive.includes(field) ? 'live' : 'wait'
}

/** The strongest effect of all that changed. null: nothing did. */
export function effectOfEdit(before: BodyFields, after: BodyFields): EditEffect | null {
  const effects = changedFields(before, after).map((field) => effectOfField(field, before, after))
  if (effects.length === 0) return null
  if (effects.includes('hide')) return 'hide'
  return effects.includes('wait') ? 'wait' : 'live'
}
