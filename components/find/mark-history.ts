// The router replaces the address when only the parameters of a place change, so the way back would skip every
// filter. A copy of the present entry is left behind for it; its state is the router's own and goes along.
/** Call before the filters change: the browser's way back then undoes the change. */
export function markHistory() {
  window.history.pushState(window.history.state, '', window.location.href)
}
