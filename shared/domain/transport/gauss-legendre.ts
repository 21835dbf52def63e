interface Node {
  at: number
  weight: number
}

/** Nodes and weights of Gauss-Legendre quadrature on −1…1, found by Newton's method on the Legendre polynomial. */
function legendreNodes(count: number): Node[] {
  return Array.from({ length: count }, (_, index) => {
    let at = Math.cos((Math.PI * (index + 0.75)) / (count + 0.5))
    let slope = 1
    for (let pass = 0; pass < 8; pass++) {
      let [before, value] = [1, at]
      for (let order = 2; order <= count; order++) {
        ;[before, value] = [value, ((2 * order - 1) * at * value - (order - 1) * before) / order]
      }
      slope = (count * (at * value - before)) / (at * at - 1)
      at -= value / slope
    }
    return { at, weight: 2 / ((1 - at * at) * slope * slope) }
  })
}

const nodes = legendreNodes(24)

/** ∫ f from `from` to `to`, exact to the last bits for the smooth functions of an ellipsoid over half a turn. */
export function integrate(f: (x: number) => number, from: number, to: number): number {
  const half = (to - from) / 2
  const middle = (to + from) / 2
  return half * nodes.reduce((sum, { at, weight }) => sum + weight * f(middle + half * at), 0)
}
