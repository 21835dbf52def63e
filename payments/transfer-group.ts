/** Ties the charges and transfers of one order together at the processor. */
export function transferGroupOf(orderId: string): string {
  return `order_${orderId}`
}
