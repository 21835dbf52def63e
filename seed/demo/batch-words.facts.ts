// What sellers write under a batch. No other animal's name, no way around the site: that is the moderators' queue.
export const openings = [
  'Graded last week, eating well.',
  'From our own broodstock, counted by hand.',
  'Even grade, no stragglers.',
  'Hardened off in outdoor tubs before pickup.',
  'Raised on well water from the first day.',
  'Moved to the front tanks, easy to net on pickup day.',
  'A calm batch that comes up to eat.',
  'Grown slowly, so they are sturdy for their size.',
] as const

export const advice = [
  'Bring a lidded pail, half full of your own water.',
  'We fast them a day before you come.',
  'We count together at the table, so take five minutes.',
  'We bag with oxygen if your drive is over an hour.',
  'Float the bag in the shade before you open it.',
  'Please park beside the barn, the lane is narrow.',
  'Ask us about your pH before you come; ours is on the tag.',
] as const

export const extras = [
  'A few more ride along for free.',
  'Next grading in three weeks.',
  'Small orders are welcome.',
  'Larger orders: give us a day more.',
  'Come early, it gets busy.',
  '',
  '',
] as const

export const treatments = [
  'None',
  'None in the last 30 days',
  'Salt bath at 3 ppt for three days after grading, nothing else',
  'One salt dip three weeks ago',
] as const

export const losses = [
  'None since the last grading',
  'Two after grading, ten days ago',
  'Five in a cold night last month',
  'None in the last 30 days',
] as const

export const evidences = [
  'A photo of each dead fish',
  'A photo of the losses in the unopened bag',
  'A photo beside a coin or ruler',
] as const

export const captions = [
  'This batch, this week',
  'Beside the ruler',
  'In the pan on grading day',
  'Front tank',
] as const
