import type { DesignWeather } from '@/shared/domain/climate/design-weather'
import type { Container, Trip } from '@/shared/domain/transport/trip'

const within = (value: number, from: number, to: number) => value >= from && value <= to
const isCount = (value: number) => Number.isInteger(value) && within(value, 1, 1_000_000)

/** Hours past which no trip of live animals is reckoned. */
const LONGEST_H = 96

const isWeather = ({ cold, hot }: DesignWeather) =>
  [cold, hot].every(({ minC, maxC }) => minC <= maxC && within(minC, -80, 60) && within(maxC, -80, 70))

/** Whether every figure of a trip is one a trip can have; anything else is not answered, never bent into shape. */
export function makesSense({ animals, water, container, legs, departHour, weather }: Trip): boolean {
  const hours = legs.reduce((sum, leg) => sum + leg.hours, 0)
  const needsWeather = legs.some((leg) => 'exposure' in leg)
  return (
    isCount(animals.count) &&
    within(animals.massG, 0.001, 5000) &&
    [animals.shortestMm, animals.longestMm].every((mm) => mm === null || within(mm, 1, 2000)) &&
    (animals.shortestMm ?? 0) <= (animals.longestMm ?? Infinity) &&
    (animals.fastedHours === null || within(animals.fastedHours, 0, 500)) &&
    within(water.startC, 0, 40) &&
    within(water.pH, 5, 10) &&
    within(water.alkalinityMeqPerL, 0.05, 10) &&
    within(hours, 0.01, LONGEST_H) &&
    legs.every((leg) => leg.hours > 0 && (!('airC' in leg) || within(leg.airC, -50, 60))) &&
    within(departHour, 0, 24) &&
    (!needsWeather || weather !== null) &&
    (weather === null || [weather.origin, weather.destination].every(isWeather)) &&
    holdsSomething(container)
  )
}

function holdsSomething(container: Container): boolean {
  if (container.kind === 'vessel') return within(container.waterL, 0.5, 10_000)
  if (container.kind === 'bedding') return within(container.beddingKg, 0.05, 1000)
  const { boxes, bagsPerBox, waterLPerBag, oxygenLPerBag } = container
  return (
    isCount(boxes) && isCount(bagsPerBox) && within(waterLPerBag, 0.1, 50) && within(oxygenLPerBag, 0.1, 150)
  )
}
