import { bookMoney } from './acts/book-money'
import { sweepIfDue } from './acts/sweep'
import { Books } from './books/books'
import { Clock } from './clock'
import { Faults } from './http/faults'
import { FrontDoor } from './http/front-door'
import { KeysInUse } from './http/idempotency'
import type { FakeSettings } from './settings'
import { takeTurn, type World } from './turn'
import { Courier } from './webhooks/courier'

const TICK_MS = 1000
const DAY_MS = 86_400_000

export interface RunningFake {
  port: number
  origin: string
  stop(): Promise<void>
}

function openBooks(settings: FakeSettings): World {
  const books = new Books(settings.booksFolder)
  const world: World = {
    settings,
    books,
    clock: new Clock(settings.clockOffsetMs),
    origin: settings.publicOrigin ?? '',
    sweptAtS: 0,
  }
  const isNew = books.draft().all('balanceTransactions').length === 0
  if (isNew && settings.openingBalanceCents > 0) {
    takeTurn(world, (turn) =>
      bookMoney(turn, {
        kind: 'topup',
        amount: settings.openingBalanceCents,
        sourceId: null,
        description: 'Opening balance',
      }),
    )
  }
  return world
}

/** Starts the practice processor in this process; the caller stops it. */
export async function startFake(settings: FakeSettings): Promise<RunningFake> {
  const world = openBooks(settings)
  const courier = new Courier(world)
  const faults = new Faults()
  const desk = { world, faults, keysInUse: new KeysInUse() }
  const refuseConnections = (ms: number) => door.closeFor(settings.host, ms)
  const door: FrontDoor = new FrontDoor({ desk, controls: { world, faults, courier, refuseConnections } })
  const port = await door.open(settings.host, settings.port)
  world.origin ||= `http://${settings.host}:${port}`
  courier.start()
  sweepIfDue(world)
  const tick = setInterval(() => {
    sweepIfDue(world)
    world.books.forgetReplies(Date.now() - DAY_MS)
  }, TICK_MS)
  return {
    port,
    origin: world.origin,
    async stop() {
      clearInterval(tick)
      courier.stop()
      await door.close()
      world.books.close()
    },
  }
}
