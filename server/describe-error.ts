interface ToldError {
  type: string
  message: string
  code?: string
  errno?: number
  /** Places in our code, without the message. */
  at?: string
  cause?: ToldError
}

/** The query builder writes the values of a failed query below its text; the driver quotes the one at fault. */
function withoutValues(message: string): string {
  return (message.split('\nparams:')[0] ?? '').replace(/'[^']*'/g, "'…'").slice(0, 600)
}

/** What a log may hold of an error: never the values that were being written, which are people's own. */
export function describeError(error: unknown): ToldError {
  if (!(error instanceof Error)) return { type: typeof error, message: withoutValues(String(error)) }
  const frames = error.stack?.split('\n').filter((line) => /^\s+at /.test(line))
  return {
    type: error.name,
    message: withoutValues(error.message),
    ...('code' in error && typeof error.code === 'string' ? { code: error.code } : {}),
    ...('errno' in error && typeof error.errno === 'number' ? { errno: error.errno } : {}),
    ...(frames && frames.length > 0 ? { at: frames.slice(0, 12).join('\n') } : {}),
    ...(error.cause === undefined ? {} : { cause: describeError(error.cause) }),
  }
}
