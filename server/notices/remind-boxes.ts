import { inTransaction, type Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import { describeListing } from '@/server/listings/describe-listing'
import { log } from '@/server/log'
import { readMailWishes } from '@/server/mail/mail-wishes-store'
import { boxReminder } from '@/server/notices/box-reminder'
import { listTold } from '@/server/notices/notice-store'
import { isReminderDue } from '@/server/notices/reminder-moments'
import {
  listArrivingBoxes,
  listLeavingBoxes,
  REMINDED_STATES,
  type BoxOnTheWay,
} from '@/server/notices/reminder-store'
import { tellMember } from '@/server/notices/tell-member'
import { loadLetterFacts } from '@/server/orders/letters/load-letter-facts'
import { listEventsOf, lockOrder } from '@/server/orders/order-store'
import { readSellers } from '@/server/orders/party-store'
import { agreementOf } from '@/server/orders/slot-agreement'

const HOUR_MS = 3_600_000
/** As far as the evening before can lie, with the hours of a promised day on top. */
const AHEAD_MS = 48 * HOUR_MS

const KIND = 'evening-before'

interface Due {
  box: BoxOnTheWay
  party: 'buyer' | 'seller'
  memberId: string
  /** The day that is spoken of, and where. */
  day: Date
  zone: string
}

/** A seller is told of the box that leaves, a buyer of the one that arrives and has left. */
async function listBoxes(at: Date): Promise<Due[]> {
  const until = new Date(at.getTime() + AHEAD_MS)
  const [leaving, arriving] = await Promise.all([listLeavingBoxes(at, until), listArrivingBoxes(at, until)])
  const sellers = await readSellers([...new Set(leaving.map(({ order }) => order.sellerId))])
  return [
    ...leaving.map((box): Due => {
      const memberId = sellers.get(box.order.sellerId)?.memberId ?? ''
      return { box, party: 'seller', memberId, day: box.order.slotStartsAt ?? at, zone: box.order.zone }
    }),
    ...arriving.map((box): Due => {
      return { box, party: 'buyer', memberId: box.order.buyerId, day: box.promisedAt, zone: box.toZone }
    }),
  ]
}

async function listDue(at: Date): Promise<(Due & { cause: string })[]> {
  const boxes = await listBoxes(at)
  const events = await listEventsOf([...new Set(boxes.map(({ box }) => box.order.id))])
  const wishes = await readMailWishes([...new Set(boxes.map(({ memberId }) => memberId))])
  return boxes.flatMap((one) => {
    const { id } = one.box.order
    const agreement = agreementOf(events.filter((event) => event.orderId === id))
    const quiet = wishes.get(one.memberId)?.quiet ?? null
    if (!agreement) return []
    const moment = { startsAt: one.day, zone: one.zone, agreedAt: agreement.agreedAt }
    const isDue = isReminderDue(KIND, moment, { at, quiet })
    return isDue ? [{ ...one, cause: `remind-box:${one.party}:${id}:${agreement.sequence}` }] : []
  })
}

/** The order may have ended or moved between the look and the lock: then nothing is said. */
async function give(tx: Tx, { box, party, memberId, cause }: Due & { cause: string }): Promise<void> {
  const order = await lockOrder(tx, box.order.id)
  const states = party === 'seller' ? REMINDED_STATES : ['dispatched']
  const isSameDay = order?.slotStartsAt?.getTime() === box.order.slotStartsAt?.getTime()
  if (!order || order.freeze !== 'none' || !isSameDay || !states.includes(order.state)) return
  const facts = await loadLetterFacts(tx, order)
  if (!facts?.shipment) return
  const { title } = describeListing(facts.terms)
  const letter = boxReminder({ ...facts, shipment: facts.shipment }, party)
  await tellMember(tx, { memberId, kind: KIND, cause, about: { orderId: order.id }, title, letter })
}

/** On the evening before: the seller of the box that leaves, the buyer of the one that arrives. */
export async function remindBoxes(): Promise<void> {
  const due = await listDue(now())
  const told = await listTold([...new Set(due.map((one) => one.cause))])
  for (const reminder of due) {
    if (told.has(`${reminder.cause} ${reminder.memberId}`)) continue
    try {
      await inTransaction((tx) => give(tx, reminder))
    } catch (error) {
      log.error({ err: error, cause: reminder.cause }, 'a reminder could not be given')
    }
  }
}
