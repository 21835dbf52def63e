/** Fills in a page of the practice processor and presses its button; fails unless it leads on to another page. */
export async function pressButton(address: string, fields: Record<string, string>): Promise<string> {
  const reply = await fetch(address, {
    method: 'POST',
    body: new URLSearchParams(fields),
    redirect: 'manual',
  })
  await reply.arrayBuffer()
  const next = reply.headers.get('location')
  if (reply.status < 300 || reply.status > 399 || !next) {
    throw new Error(`${address} answered ${reply.status}: is this the practice processor?`)
  }
  return next
}
