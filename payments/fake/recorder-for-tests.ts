import { createServer, request as send } from 'node:http'

export interface RecordedAnswer {
  object?: string
  error?: { code?: string }
  /** The objects of a list, or what an event carries. */
  data?: unknown
}

export interface Recorded {
  method: string
  path: string
  requestBody: string
  status: number
  answer: RecordedAnswer
}

export interface Recorder {
  port: number
  recorded: Recorded[]
  stop(): Promise<void>
}

/** Stands between the SDK and the practice processor and writes down what goes through, unchanged. */
export async function startRecorder(fakePort: number): Promise<Recorder> {
  const recorded: Recorded[] = []
  const server = createServer((request, response) => {
    const asked: Buffer[] = []
    request.on('data', (part: Buffer) => asked.push(part))
    request.on('end', () => {
      const { method = 'GET', url = '/', headers } = request
      const onward = send({ host: '127.0.0.1', port: fakePort, method, path: url, headers }, (answer) => {
        const told: Buffer[] = []
        answer.on('data', (part: Buffer) => told.push(part))
        answer.on('end', () => {
          const body = Buffer.concat(told)
          const status = answer.statusCode ?? 0
          const requestBody = Buffer.concat(asked).toString()
          recorded.push({ method, path: url, requestBody, status, answer: JSON.parse(body.toString()) })
          response.writeHead(status, answer.headers).end(body)
        })
      })
      onward.on('error', () => request.socket.destroy())
      onward.end(Buffer.concat(asked))
    })
  })
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
  const address = server.address()
  if (address === null || typeof address === 'string') throw new Error('no port')
  return {
    port: address.port,
    recorded,
    async stop() {
      server.closeAllConnections()
      await new Promise((resolve) => server.close(resolve))
    },
  }
}
