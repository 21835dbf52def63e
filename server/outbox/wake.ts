let listener: (() => void) | undefined

/** The worker registers here; a change that queued an effect wakes it without either importing the other. */
export function onOutboxWake(wake: (() => void) | undefined): void {
  listener = wake
}

/** Called inside transactions too: the worker waits a moment, so that the commit is through when it looks. */
export function wakeOutbox(): void {
  listener?.()
}
