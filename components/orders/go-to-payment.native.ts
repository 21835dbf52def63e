import { openBrowserAsync } from 'expo-web-browser'

/** Opens the processor's own page over the app; closing it comes back to the order. */
export function goToPayment(url: string): void {
  void openBrowserAsync(url)
}
