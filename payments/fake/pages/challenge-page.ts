import { answerChallenge } from '../acts/answer-challenge'
import { completeIfPaid } from '../acts/pay-session'
import type { PaymentRow } from '../books/rows'
import type { Answer } from '../http/answer'
import { textOf, type Form } from '../http/form'
import type { Turn } from '../turn'
import { successAddress } from './checkout-page'
import { lostPage, page, practiceNote, redirect } from './frame'
import { dollars, html } from './html'

/** Where the buyer goes on once the bank has its answer. */
function nextAddress(turn: Turn, payment: PaymentRow): string | null {
  const session = payment.sessionId === null ? undefined : turn.draft.get('sessions', payment.sessionId)
  if (session) return session.status === 'complete' ? successAddress(session) : `/pay/${session.id}`
  if (payment.returnUrl === null) return null
  const address = new URL(payment.returnUrl)
  address.searchParams.set('payment_intent', payment.id)
  return address.href
}

function answered(turn: Turn, payment: PaymentRow): Answer {
  const next = nextAddress(turn, payment)
  if (next !== null) return redirect(next)
  return page({
    title: 'Answered',
    body: html`${practiceNote}
      <h1>The bank has your answer</h1>
      <p>You can close this page.</p>`,
  })
}

export function showChallenge(turn: Turn, id: string): Answer {
  const payment = turn.draft.get('payments', id)
  if (!payment) return lostPage()
  if (payment.status !== 'requires_action') return answered(turn, payment)
  const body = html`${practiceNote}
    <h1>Do you approve this payment?</h1>
    <p>With a real card, the bank would now ask its holder (3-D Secure). Here you answer for the bank.</p>
    <dl>
      <div>
        <dt>${payment.description ?? 'Payment'}</dt>
        <dd>${dollars(payment.amount)}</dd>
      </div>
    </dl>
    <form method="post" action="/challenge/${payment.id}">
      <div class="acts">
        <button type="submit" name="verdict" value="approve">Approve</button>
        <button type="submit" name="verdict" value="refuse" class="second">Refuse</button>
      </div>
    </form>`
  return page({ title: 'Approval by the bank', body, leadsTo: [payment.returnUrl] })
}

export function submitChallenge(turn: Turn, id: string, form: Form): Answer {
  const payment = turn.draft.get('payments', id)
  if (!payment) return lostPage()
  if (payment.status !== 'requires_action') return answered(turn, payment)
  const after = answerChallenge(turn, payment, textOf(form, 'verdict') === 'approve')
  const session = after.sessionId === null ? undefined : turn.draft.get('sessions', after.sessionId)
  if (session) completeIfPaid(turn, session, after)
  return answered(turn, after)
}
