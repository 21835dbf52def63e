/** @param {string[][]} rows */
function columns(rows) {
  const widths = rows[0]?.map((_, at) => Math.max(...rows.map((row) => row[at]?.length ?? 0))) ?? []
  return rows.map((row) => `  ${row.map((cell, at) => cell.padEnd(widths[at] ?? 0)).join('  ')}`.trimEnd())
}

/**
 * What a person needs to know once everything runs. Passwords are shown for local work only.
 * @param {import('./start-product.mjs').Product} product
 * @param {{ people: import('./demo-people.mjs').DemoPerson[], production: boolean, clockOffsetMs: number }} shown
 */
export function greeting(
  { origin, mailOrigin, payOrigin, weatherOrigin },
  { people, production, clockOffsetMs },
) {
  const lines = ['', `Tankward is ready:  ${origin}`]
  if (mailOrigin) lines.push(`Mail it has sent:   ${mailOrigin}`)
  if (payOrigin) lines.push(`Practice payments:  ${payOrigin}`)
  if (weatherOrigin) lines.push(`Practice weather:   ${weatherOrigin}`)
  if (clockOffsetMs !== 0) {
    const day = new Date(Date.now() + clockOffsetMs).toISOString().slice(0, 10)
    lines.push(`For Tankward, today is ${day} (sign-in and logs keep real time).`)
  }
  if (people.length > 0 && !production) {
    lines.push('', 'Demo people (invented):')
    lines.push(...columns(people.map((one) => [one.role, one.email, one.password, one.note ?? ''])))
    if (people.some((one) => one.totpSecret)) {
      lines.push('Staff need a second factor: npm run demo:code prints the current codes.')
    }
  }
  return [...lines, '', 'Ctrl-C stops everything.'].join('\n')
}
