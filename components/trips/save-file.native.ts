/** The phone app has no print sheet yet: its page shows every figure of the plan. */
export function saveFile(): void {
  throw new Error('The sheet can be printed from the web page.')
}
