import type { OrderState } from '@/shared/domain/orders/states.facts'

export interface MoveFacts {
  state: OrderState
  /** Who reads the screen. Staff read what the buyer would, without `you`. */
  party: 'buyer' | 'seller' | 'staff'
  handOver: 'pickup' | 'ship'
  balanceDue: 'before' | 'at-handover'
  balancePaid: boolean
}

export interface Move {
  whose: 'you' | 'other' | 'both' | 'nobody'
  words: string
}

type Turn = readonly [whose: 'buyer' | 'seller' | 'both' | 'nobody', forBuyer: string, forSeller: string]

/** Who has to do what now, in words for the reader. */
export function whoseMove(facts: MoveFacts): Move {
  const [whose, forBuyer, forSeller] = turnOf(facts)
  if (facts.party === 'staff')
    return { whose: whose === 'nobody' ? 'nobody' : 'other', words: thirdPerson(whose) }
  const words = facts.party === 'seller' ? forSeller : forBuyer
  return {
    whose: whose === facts.party ? 'you' : whose === 'buyer' || whose === 'seller' ? 'other' : whose,
    words,
  }
}

function turnOf({ state, handOver, balanceDue, balancePaid }: MoveFacts): Turn {
  const isOwing = !balancePaid
  switch (state) {
    case 'reserved':
      return ['buyer', 'Pay the deposit to keep them.', 'The buyer is paying the deposit.']
    case 'requested':
      return ['seller', 'The seller answers. Your card is not charged before that.', 'Accept or decline.']
    case 'pledged':
      return ['nobody', 'The run is filling up.', 'The run is filling up.']
    case 'deposit_paid':
      return handOver === 'ship'
        ? ['both', 'Choose a ship day.', 'Choose a ship day.']
        : ['both', 'Agree on a day.', 'Agree on a day.']
    case 'scheduled':
      return isOwing && balanceDue === 'before'
        ? ['buyer', 'Pay the balance.', 'The buyer pays the balance.']
        : ['seller', 'The seller gets them ready.', 'Mark the order ready.']
    case 'weather_hold':
      return [
        'buyer',
        'Agree on another day, or end it for a full refund.',
        'The buyer answers about the new day.',
      ]
    case 'ready':
      return readyTurn(handOver, isOwing)
    case 'dispatched':
      return ['nobody', 'On the way. Be there when it comes, then say that it is here.', 'On the way.']
    case 'arrived':
    case 'handed_over':
      return ['buyer', 'Say that all is well, or report a loss.', 'The buyer looks the animals over.']
    case 'claim_open':
      if (handOver === 'ship') {
        return [
          'nobody',
          'We look at what became of the box. If it comes after all, say so.',
          'We look at what became of the box.',
        ]
      }
      return ['seller', 'The seller answers the claim.', 'Answer the claim.']
    case 'settled':
      return ['nobody', 'Done.', 'Done. The money is on its way to you.']
    case 'cancelled':
      return ['nobody', 'Ended.', 'Ended.']
  }
}

function readyTurn(handOver: MoveFacts['handOver'], isOwing: boolean): Turn {
  if (handOver === 'ship')
    return ['seller', 'The seller sends the box.', 'Check the route, then send the box.']
  return isOwing
    ? [
        'buyer',
        'Pay the balance when you are there; then your code appears.',
        'The buyer pays the balance at the hand-over.',
      ]
    : [
        'both',
        'Come in the window, count together, give the code last.',
        'Count together, then enter the buyer’s code.',
      ]
}

function thirdPerson(whose: Turn[0]): string {
  const waiting = {
    buyer: 'Waiting for the buyer.',
    seller: 'Waiting for the seller.',
    both: 'Waiting for both.',
  }
  return whose === 'nobody' ? 'Nobody has to act.' : waiting[whose]
}
