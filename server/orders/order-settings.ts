interface OrderSettings {
  /** Where people come back to from the payment page. */
  origin: string
  feeBp: number
}

let settings: OrderSettings | undefined

export function configureOrders(given: OrderSettings): void {
  settings = given
}

export function orderSettings(): OrderSettings {
  if (!settings) throw new Error('configureOrders() has not been called')
  return settings
}
