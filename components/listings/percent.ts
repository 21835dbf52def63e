/** "25 %", never torn apart at the end of a line. */
export function percent(value: number): string {
  return `${value}\u00a0%`
}
