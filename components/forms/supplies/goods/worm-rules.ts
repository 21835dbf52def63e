import { commonRules, kindOf, netWeight } from './common-rules'
import { free, freeText, number, oneOf, some, text, whole, yesNo, type LotRule } from './lot-shape'

const length = 'A length, like 3 in.'

export const wormRules: readonly LotRule[] = [
  { path: 'taxonId', fits: text(60), ask: 'Pick the worm from the list, genus and species.' },
  { path: 'strain', fits: freeText(80), ask: 'At most 80 characters.' },
  {
    path: 'grading',
    fits: oneOf(['bed-run', 'sized']),
    ask: 'Bed-run (all sizes as they come), or sorted by size?',
  },
  { path: 'sizeLoMm', fits: free(number(3, 400)), ask: length },
  { path: 'sizeHiMm', fits: free(number(3, 400)), ask: length },
  { path: 'bedding', fits: text(120), ask: 'What are they packed in? Damp peat or coir, for instance.' },
  {
    path: 'lotChecked',
    fits: (value) => value === true,
    ask: 'Look through the lot for jumping worms, also called snake worms or Alabama jumpers, then tick this.',
  },
  { path: 'raisedInUs', fits: yesNo, ask: 'Were they raised in the United States? Yes or no.' },
  { path: 'origin', fits: oneOf(['hatched-here', 'grown-on', 'bought-in']), ask: 'Where do they come from?' },
  { path: 'originState', fits: free(text(2)), ask: 'Two letters of a state, like OH.' },
  {
    path: 'wildCaught',
    fits: (value) => value === false,
    ask: 'Worms dug up or caught in the wild are not listed here.',
  },
  {
    path: 'licenceNumbers',
    fits: text(300),
    ask: 'Your licence or permit numbers, or "none needed" and why.',
  },
  { path: 'statesServed', fits: some(51), ask: 'Which states do you serve?' },
  { path: 'statesServed.*', fits: text(2), ask: 'Two letters of a state, like OH.' },
  {
    path: 'saleUnit.kind',
    fits: oneOf(['pack', 'weight']),
    ask: 'Say how much one unit is: a pack of so many worms, or a packed weight like 1 lb.',
  },
  {
    path: 'saleUnit.count',
    fits: whole(1, 100_000),
    ask: 'How many are in one pack? Like 250.',
    when: ({ saleUnit }) => kindOf(saleUnit) === 'pack',
  },
  netWeight,
  {
    path: 'countMethod',
    fits: free(oneOf(['hand', 'sample-weight', 'displacement'])),
    ask: 'How do you count: by hand, by a weighed sample, by displacement?',
  },
  { path: 'overcountPct', fits: whole(0, 15), ask: 'How many extra do you pack, in percent? 0 to 15.' },
  { path: 'promise.windowHours', fits: whole(4, 24), ask: '4 to 24 hours.' },
  {
    path: 'promise.survivalDays',
    fits: (value) => value === 0 || whole(3, 7)(value),
    ask: 'No survival promise (0), or 3 to 7 days.',
  },
  { path: 'promise.remedy', fits: oneOf(['refund', 'replace']), ask: 'A refund, or new worms?' },
  {
    path: 'promise.evidence',
    fits: text(200),
    ask: 'What should the buyer show you? A photo of the open bag, for instance.',
  },
  ...commonRules({ least: 10, most: 50, leastFreeHours: 12 }),
]
