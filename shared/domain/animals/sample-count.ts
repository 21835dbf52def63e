interface Sample {
  /** Animals counted. */
  count: number
  /** What they weigh together. */
  massG: number
}

/** Mean mass of an animal over all samples together, g. null without a sample, or where one is not above zero. */
export function meanMassOfSamplesG(samples: readonly Sample[]): number | null {
  if (samples.length === 0 || samples.some(({ count, massG }) => !(count > 0 && massG > 0))) return null
  const sum = (key: keyof Sample) => samples.reduce((total, sample) => total + sample[key], 0)
  return sum('massG') / sum('count')
}

/** Animals in a lot weighed as a whole, not rounded. null as above, or for a lot below zero. */
export function countOfLot(samples: readonly Sample[], lotMassG: number): number | null {
  const mean = meanMassOfSamplesG(samples)
  return mean !== null && lotMassG >= 0 ? lotMassG / mean : null
}
