/** Leaves for the processor's own page; it comes back to the order. */
export function goToPayment(url: string): void {
  window.location.assign(url)
}
