export type ReasonCode = keyof typeof reasonTexts

/** What each reason says, and in which unit its value and limit are. Screens put the figures beside the sentence. */
export const reasonTexts = {
  'too-cold': { unit: '°C', text: 'The water gets colder than this animal should travel in.' },
  'nearly-too-cold': {
    unit: '°C',
    text: 'The water comes within 1 °C of the coldest this animal should travel in.',
  },
  'too-warm': { unit: '°C', text: 'The water gets warmer than this animal should travel in.' },
  'nearly-too-warm': {
    unit: '°C',
    text: 'The water comes within 1 °C of the warmest this animal should travel in.',
  },
  freezes: { unit: '°C', text: 'The water would begin to freeze.' },
  'changes-too-far': { unit: '°C', text: 'The water changes by more than 18 °F (10 °C) on the way.' },
  'bag-too-full': {
    unit: 'g/L',
    text: 'More animals in the bag than the loading table allows for this long and this warm.',
  },
  'bag-nearly-full': {
    unit: 'g/L',
    text: 'The bag is loaded to more than nine tenths of what the table allows.',
  },
  'longer-than-table': { unit: 'h', text: 'Nobody published loads for a trip this long.' },
  'no-oxygen-model': {
    unit: '',
    text: 'No oxygen use is published for this animal, so the bag cannot be reckoned.',
  },
  'too-small-for-model': { unit: 'g', text: 'The oxygen model does not reach this size or temperature.' },
  'oxygen-runs-out': { unit: 'g', text: 'The animals use more oxygen than the bag holds.' },
  'oxygen-runs-low': { unit: 'g', text: 'The animals use more than two thirds of the oxygen in the bag.' },
  'water-short-of-oxygen': {
    unit: 'mg/L',
    text: 'The water falls below the least oxygen this animal stands.',
  },
  'water-low-in-oxygen': { unit: 'mg/L', text: 'The water falls below the oxygen this animal should have.' },
  'carbon-dioxide-high': { unit: 'mg/L', text: 'Carbon dioxide builds up to a level that stuns.' },
  'carbon-dioxide-raised': {
    unit: 'mg/L',
    text: 'Carbon dioxide builds up to a level that burdens the animals.',
  },
  'ammonia-high': { unit: 'mg N/L', text: 'Un-ionised ammonia comes near what harms within hours.' },
  'ammonia-raised': { unit: 'mg N/L', text: 'Un-ionised ammonia passes what the animal stands for long.' },
  'vessel-too-full': { unit: 'g/L', text: 'More animals in the water than is usual with this much air.' },
  'change-water': { unit: 'h', text: 'A trip this long needs a full change of water on the way.' },
  'needs-water': { unit: '', text: 'This animal travels in water.' },
  'needs-damp': { unit: '', text: 'This animal travels damp and out of standing water, not in a bag of it.' },
  'air-too-cold': {
    unit: '°C',
    text: 'The air outside gets too cold for worms and larvae in a box without insulation.',
  },
  'air-too-warm': {
    unit: '°C',
    text: 'The air outside gets too warm for worms and larvae in a box without insulation.',
  },
  'damp-for-long': { unit: 'h', text: 'Damp animals out of water for longer than is known to go well.' },
  'pack-without-air': { unit: '', text: 'A heat pack needs air: a box without holes puts it out.' },
  'spines-puncture': { unit: 'mm', text: 'Catfish of this length puncture bags with their spines.' },
  'sizes-too-mixed': {
    unit: 'ratio',
    text: 'The sizes are too mixed to share a bag: the small ones get hurt or eaten.',
  },
  'not-fasted': { unit: 'h', text: 'The animals have not been kept without food for long enough.' },
  'fasting-unsaid': { unit: 'h', text: 'Nobody said how long the animals have gone without food.' },
  'does-not-fit': { unit: 'L', text: 'The bags do not fit into the box.' },
  absurd: { unit: '', text: 'A figure of the trip is missing or makes no sense.' },
  'stand-in-model': { unit: '', text: 'Oxygen use is reckoned by a related animal.' },
} as const
