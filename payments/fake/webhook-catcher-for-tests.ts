import { createServer, type IncomingMessage } from 'node:http'

export interface CaughtWebhook {
  id: string
  type: string
  rawBody: Buffer
  signature: string
}

export interface WebhookCatcher {
  url: string
  caught: CaughtWebhook[]
  /** The first one caught; throws when there is none. */
  first(): CaughtWebhook
  /** Answers this status from now on. */
  answerWith(status: number): void
  /** Waits until `enough` holds; throws after five seconds. */
  until(enough: (caught: CaughtWebhook[]) => boolean): Promise<void>
  stop(): Promise<void>
}

async function bodyOf(request: IncomingMessage): Promise<Buffer> {
  const parts: Buffer[] = []
  for await (const part of request) parts.push(part)
  return Buffer.concat(parts)
}

/** Stands where the platform takes its webhooks. */
export async function startWebhookCatcher(port = 0): Promise<WebhookCatcher> {
  const caught: CaughtWebhook[] = []
  let status = 200
  const server = createServer((request, response) => {
    void bodyOf(request).then((rawBody) => {
      const event: { id: string; type: string } = JSON.parse(rawBody.toString())
      caught.push({
        id: event.id,
        type: event.type,
        rawBody,
        signature: String(request.headers['stripe-signature']),
      })
      response.writeHead(status).end()
    })
  })
  await new Promise<void>((resolve) => server.listen(port, '127.0.0.1', resolve))
  const address = server.address()
  if (address === null || typeof address === 'string') throw new Error('no port')
  return {
    url: `http://127.0.0.1:${address.port}/hook`,
    caught,
    first() {
      const [one] = caught
      if (!one) throw new Error('no webhook was caught')
      return one
    },
    answerWith(wanted) {
      status = wanted
    },
    async until(enough) {
      for (let waitedMs = 0; !enough(caught); waitedMs += 10) {
        if (waitedMs > 5000)
          throw new Error(`waited in vain; caught ${caught.map((one) => one.type).join(', ')}`)
        await new Promise((resolve) => setTimeout(resolve, 10))
      }
    },
    async stop() {
      server.closeAllConnections()
      await new Promise((resolve) => server.close(resolve))
    },
  }
}
