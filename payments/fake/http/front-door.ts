import { createServer, type Server, type ServerResponse } from 'node:http'
import type { AddressInfo } from 'node:net'
import { answerPageCall } from '../pages/page-call'
import type { Answer } from './answer'
import { answerApiCall, type Desk } from './api-call'
import { answerControlCall, type Controls } from './control'
import { readIncoming, type Incoming } from './incoming'

export interface Rooms {
  desk: Desk
  controls: Controls
}

function send(response: ServerResponse, answer: Answer): void {
  response.writeHead(answer.status, { ...answer.headers, 'content-length': Buffer.byteLength(answer.body) })
  response.end(answer.body)
}

async function answer(rooms: Rooms, incoming: Incoming): Promise<Answer | null> {
  if (incoming.path.startsWith('/v1/')) return answerApiCall(rooms.desk, incoming)
  if (incoming.path.startsWith('/_control/')) return answerControlCall(rooms.controls, incoming)
  return answerPageCall(rooms.desk.world, incoming)
}

/** The HTTP server. It can close and open again on the same port, as a processor that is away would look. */
export class FrontDoor {
  private readonly server: Server
  private reopening: NodeJS.Timeout | null = null
  private port = 0

  constructor(rooms: Rooms) {
    this.server = createServer((request, response) => {
      const refuse = () => request.socket.destroy()
      readIncoming(request)
        .then(async (incoming) => {
          if (!incoming) return refuse()
          const found = await answer(rooms, incoming)
          if (found) send(response, found)
          else refuse()
        })
        .catch((error: unknown) => {
          console.error(error)
          refuse()
        })
    })
  }

  async open(host: string, port: number): Promise<number> {
    await new Promise<void>((resolve, reject) => {
      this.server.once('error', reject)
      this.server.listen(port, host, () => {
        this.server.off('error', reject)
        resolve()
      })
    })
    const address: AddressInfo | string | null = this.server.address()
    if (address === null || typeof address === 'string') throw new Error('the server listens on no port')
    this.port = address.port
    return this.port
  }

  closeFor(host: string, ms: number): void {
    if (this.reopening) clearTimeout(this.reopening)
    this.server.close()
    // The control call itself gets its answer first.
    setTimeout(() => this.server.closeAllConnections(), 20)
    this.reopening = setTimeout(() => void this.open(host, this.port), ms)
  }

  /** Answers what is under way, then closes. */
  async close(): Promise<void> {
    if (this.reopening) clearTimeout(this.reopening)
    await new Promise<void>((resolve) => {
      this.server.close(() => resolve())
      this.server.closeIdleConnections()
    })
  }
}
