// Short, in our own words. {…} is filled by fillCaution. They tell what we found and do; they never rule on a law.
export const cautionTexts = {
  'G-1':
    'Never let these animals, their water or eggs reach a stream, pond, ditch or storm drain. If you no longer want them, ask us or your state agency.',
  'G-2':
    'Rules differ by state and county and change. What we show is what we found at {source}, checked {date}. Please check with {agency} before you pay.',
  'G-3': 'Nobody has checked this species for {state} for us. We cannot tell you it is allowed.',
  'G-4': 'We do not list this species. That is our policy for everyone.',
  'G-5':
    'Crossing a state line with an animal that either state forbids can be a federal case for buyer and seller.',
  'G-6': 'This order needs your permit. We hold the fish and your deposit until it is accepted or {date}.',
  'G-7': 'Keep new fish apart for about three weeks.',
  'G-8':
    'Bag sealed more than {hours} hours: float in shade, match temperature, open, release at once. Shorter trip: add your water little by little.',
  'G-9': 'Wash before eating. Grown with fish water at the roots; keep cold.',
  'G-10':
    'The route is too {extreme} on {day}: {place} {temperature}. We propose {date}. You may cancel for a full refund.',
  'G-11': 'Your money is held by our payment processor until you confirm or {time}.',
  'G-12':
    'Meet by daylight, in a public place if it is not a farm; tell someone; count together; give the code last.',
  'G-13': 'Not legal, veterinary or food-safety advice.',
  'G-14':
    'This box rule: strong double-wall carton, contents written on the address side, no free postal boxes.',
} as const

export type CautionId = keyof typeof cautionTexts
