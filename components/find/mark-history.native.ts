/** Apps have no address bar: the way back leaves the screen. */
export function markHistory() {}
