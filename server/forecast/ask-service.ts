import { Worker } from 'node:worker_threads'

export interface ServiceAsk {
  address: string
  params: Record<string, string>
  withinMs: number
}

interface ReplyBlock {
  fromS: number
  /** The end is not part of it. */
  untilS: number
  stepS: number
  /** One list a variable, in the order asked for. */
  lists: number[][]
}

/** What the service said, decoded and not yet judged. */
export interface ServiceReply {
  zone: string
  offsetS: number
  daily: ReplyBlock | null
  hourly: ReplyBlock | null
}

interface Told {
  id: number
  reply?: ServiceReply
  failure?: string
}

interface Waiting {
  done: (reply: ServiceReply) => void
  fail: (error: Error) => void
}

/** Beyond the client's own time-out: after this the thread is stuck, not slow. */
const STUCK_AFTER_MS = 400

let thread: Worker | undefined
let lastId = 0
const waiting = new Map<number, Waiting>()

function drop(gone: Worker, why: string): void {
  if (thread !== gone) return
  thread = undefined
  for (const { fail } of waiting.values()) fail(new Error(why))
  waiting.clear()
  void gone.terminate()
}

function startThread(): Worker {
  const file = new URL('./ask-service-thread.mjs', import.meta.url)
  const started = new Worker(file, { execArgv: [] })
  started.on('message', ({ id, reply, failure }: Told) => {
    const asked = waiting.get(id)
    waiting.delete(id)
    if (reply) asked?.done(reply)
    else asked?.fail(new Error(failure ?? 'no words'))
  })
  started.on('error', (error) => drop(started, `the forecast thread failed: ${error.message}`))
  started.on('exit', () => drop(started, 'the forecast thread ended'))
  // A server that wants to end does not wait for it. Said last: a listener for messages would hold it again.
  started.unref()
  return started
}

/**
 * Asks through the service's own client; throws what it throws. The client runs in a thread of its own: there its
 * `fetch` can be guarded without touching ours, and a reply on which it turns for ever is ended with the thread.
 */
export async function askService(ask: ServiceAsk): Promise<ServiceReply> {
  thread ??= startThread()
  const asked = thread
  const id = (lastId += 1)
  let stuck: NodeJS.Timeout | undefined
  try {
    return await new Promise<ServiceReply>((done, fail) => {
      waiting.set(id, { done, fail })
      stuck = setTimeout(
        () => drop(asked, 'the forecast client was stuck on the reply'),
        ask.withinMs + STUCK_AFTER_MS,
      )
      asked.postMessage({ id, ask })
    })
  } finally {
    clearTimeout(stuck)
  }
}
