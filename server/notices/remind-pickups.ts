import { inTransaction, type Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import { describeListing } from '@/server/listings/describe-listing'
import { log } from '@/server/log'
import { readMailWishes } from '@/server/mail/mail-wishes-store'
import { listTold } from '@/server/notices/notice-store'
import { reminderLetter } from '@/server/notices/reminder-letters'
import { isReminderDue, type Pickup, type ReminderKind } from '@/server/notices/reminder-moments'
import { listPickups, REMINDED_STATES } from '@/server/notices/reminder-store'
import { tellMember } from '@/server/notices/tell-member'
import { loadLetterFacts } from '@/server/orders/letters/load-letter-facts'
import { listEventsOf, lockOrder, type OrderRow } from '@/server/orders/order-store'
import { readSellers } from '@/server/orders/party-store'
import { agreementOf, type Agreement } from '@/server/orders/slot-agreement'

/** The evening before lies at most 30 hours ahead, 31 in the night the clocks go back. */
const AHEAD_MS = 32 * 3_600_000
const KINDS: ReminderKind[] = ['evening-before', 'two-hours-before']

interface Reminder {
  order: OrderRow
  kind: ReminderKind
  party: 'buyer' | 'seller'
  memberId: string
  cause: string
}

const pickupOf = (order: OrderRow, agreement: Agreement): Pickup | null =>
  order.slotStartsAt ? { startsAt: order.slotStartsAt, zone: order.zone, agreedAt: agreement.agreedAt } : null

/** Every reminder whose time has come, given or not. */
async function listDue(at: Date): Promise<Reminder[]> {
  const orders = await listPickups(at, new Date(at.getTime() + AHEAD_MS))
  const sellers = await readSellers([...new Set(orders.map((order) => order.sellerId))])
  const events = await listEventsOf(orders.map((order) => order.id))
  const memberOf = (order: OrderRow, party: Reminder['party']) =>
    party === 'buyer' ? order.buyerId : sellers.get(order.sellerId)?.memberId
  const members = orders.flatMap((order) => [memberOf(order, 'buyer') ?? '', memberOf(order, 'seller') ?? ''])
  const wishes = await readMailWishes([...new Set(members)])
  return orders.flatMap((order) => {
    const agreement = agreementOf(events.filter((event) => event.orderId === order.id))
    const pickup = agreement && pickupOf(order, agreement)
    if (!agreement || !pickup) return []
    return (['buyer', 'seller'] as const).flatMap((party) => {
      const memberId = memberOf(order, party)
      if (!memberId) return []
      const quiet = wishes.get(memberId)?.quiet ?? null
      return KINDS.filter((kind) => isReminderDue(kind, pickup, { at, quiet })).map((kind) => ({
        order,
        kind,
        party,
        memberId,
        // A moved pickup is another agreement, so its reminders are others too.
        cause: `remind:${kind}:${order.id}:${agreement.sequence}`,
      }))
    })
  })
}

/** The order may have ended or moved between the look and the lock: then nothing is said. */
async function give(tx: Tx, { order: seen, kind, party, memberId, cause }: Reminder): Promise<void> {
  const order = await lockOrder(tx, seen.id)
  const stands =
    order?.freeze === 'none' &&
    REMINDED_STATES.includes(order.state) &&
    order.slotStartsAt?.getTime() === seen.slotStartsAt?.getTime()
  if (!order || !stands) return
  const facts = await loadLetterFacts(tx, order)
  if (!facts) return
  const { title } = describeListing(facts.terms)
  const letter = reminderLetter(facts, kind, party)
  await tellMember(tx, { memberId, kind, cause, about: { orderId: order.id }, title, letter })
}

/** Reminds both parties of pickups on the evening before and two hours before; each once for each agreed time. */
export async function remindPickups(): Promise<void> {
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
