/** Rounds half away from zero to a step (0.25, 0.1, 1, 5 …). Absorbs the last bits of binary fractions. */
export function roundTo(value: number, step: number): number {
  const steps = Math.round(Math.abs(value / step) + 1e-9)
  const rounded = Number((steps * step).toFixed(6))
  return value < 0 && rounded !== 0 ? -rounded : rounded
}
