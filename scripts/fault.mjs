import { explainFailure } from './explain-failure.mjs'

/** A failure that the person at the keyboard can mend: its message is the whole story. */
export class Fault extends Error {
  /** @param {string} message */
  constructor(message) {
    super(message)
    this.name = 'Fault'
  }
}

/** What to print: a sentence where we have one, else the whole stack. @param {unknown} error */
export function sentenceOf(error) {
  if (!(error instanceof Error)) return String(error)
  if (error.name === 'Fault' || error.name === 'MariadbFault') return error.message
  const known = 'syscall' in error ? explainFailure(error.message) : null
  return known ? `${known} (${error.message})` : (error.stack ?? error.message)
}
