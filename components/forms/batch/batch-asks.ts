/** What each answer that has no words in the contract is asked for with; rows are named without their number. */
export const batchAsks: Readonly<Record<string, string>> = {
  hatchedOn: 'When did they hatch? About is fine.',
  readyOn: 'From which day are they ready?',
  'tiers.unitCents': 'A price for each fish, like $0.89.',
  overcountPct: 'How many percent are packed free? 0 is an answer.',
  sexClaimPct: 'A share of 50 to 100 %, or leave it empty.',
  'feed.since': 'Since which day?',
  'water.saltPpt': 'Salt in ppt; 0 is an answer.',
  'water.measuredOn': 'On which day was the water measured?',
  'windows.day': 'On which day may people come?',
  placeKind: 'Where do people collect?',
  freeCancelHours: 'How many hours before the pickup? 12 to 336.',
  'promise.windowHours': 'How many hours? 4 to 24.',
  'promise.survivalDays': 'A promise of 3 to 7 days, or none.',
  'photos.takenOn': 'On which day was the photo taken?',
}
