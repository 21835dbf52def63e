import type { Tone } from '@/constants/theme'
import type { OrderRow } from '@/shared/contracts/orders'

type State = OrderRow['state']

const words: Record<State, [word: string, tone: Tone]> = {
  reserved: ['Held, not paid', 'caution'],
  requested: ['Waiting for the seller', 'info'],
  pledged: ['Pledged', 'info'],
  deposit_paid: ['Deposit paid', 'info'],
  scheduled: ['Day agreed', 'info'],
  weather_hold: ['On hold for weather', 'caution'],
  ready: ['Ready to collect', 'today'],
  dispatched: ['On its way', 'info'],
  handed_over: ['Handed over', 'safe'],
  arrived: ['Arrived', 'safe'],
  claim_open: ['Claim open', 'caution'],
  settled: ['Complete', 'safe'],
  cancelled: ['Ended', 'neutral'],
}

const readyToSend: (typeof words)['ready'] = ['Ready to send', 'today']

/** The state as a word of the trade, for badges. */
export function stateWord(state: State, handOver: OrderRow['handOver']): { word: string; tone: Tone } {
  const [word, tone] = state === 'ready' && handOver === 'ship' ? readyToSend : words[state]
  return { word, tone }
}
