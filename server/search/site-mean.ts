// House rules: what a rating is taken to be before the site has enough of its own to tell, and how many those are.
const ORDINARY_MEAN = 4
const LEAST_RATINGS = 20

let mean = ORDINARY_MEAN

/** The mean of all ratings of the site, to a tenth: what sellers with few ratings are drawn towards. */
export function siteMean(): number {
  return mean
}

export function siteMeanOf(all: { count: number; mean: number }): number {
  return all.count < LEAST_RATINGS ? ORDINARY_MEAN : Math.round(all.mean * 10) / 10
}

/** True when it is another one than before: what was ranked by the old one is out of step. */
export function setSiteMean(now: number): boolean {
  const isNew = now !== mean
  mean = now
  return isNew
}
