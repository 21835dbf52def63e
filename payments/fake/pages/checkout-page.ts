import { paySession } from '../acts/pay-session'
import type { SessionRow } from '../books/rows'
import type { Answer } from '../http/answer'
import type { Form } from '../http/form'
import { totalOf } from '../objects/checkout-session'
import type { Turn } from '../turn'
import {
  cardFieldsHtml,
  emptyCard,
  practiceCardsHtml,
  readCard,
  typedCardOf,
  type FieldErrors,
  type TypedCard,
} from './card-form'
import { lostPage, page, practiceNote, redirect } from './frame'
import { dollars, html, type Html } from './html'

interface Shown {
  typed: TypedCard
  errors: FieldErrors
  problem: string | null
}

export function successAddress(session: SessionRow): string {
  return session.successUrl.replaceAll('{CHECKOUT_SESSION_ID}', session.id)
}

function linesHtml(session: SessionRow): Html {
  const lines = session.lines.map((line) => {
    const count = line.quantity > 1 ? `${line.quantity} × ` : ''
    return html`<div>
      <dt>${count}${line.name}</dt>
      <dd>${dollars(line.unitAmount * line.quantity)}</dd>
    </div>`
  })
  return html`<dl>
    ${lines}
    <div class="total">
      <dt>Total</dt>
      <dd>${dollars(totalOf(session))}</dd>
    </div>
  </dl>`
}

function problemHtml(problem: string | null): Html | null {
  if (problem === null) return null
  return html`<div class="problem" role="alert" tabindex="-1" autofocus>
    <p><strong>${problem}</strong></p>
  </div>`
}

function openPage(session: SessionRow, shown: Shown): Answer {
  const amount = dollars(totalOf(session))
  const isHold = session.captureMethod === 'manual'
  const act = isHold ? `Hold ${amount}` : `Pay ${amount}`
  const hold = html`<p>The amount is only held on the card for now. It is taken when the seller accepts.</p>`
  const back = session.cancelUrl ? html`<a href="${session.cancelUrl}">Go back without paying</a>` : null
  const body = html`${practiceNote}
    <h1>${act}</h1>
    ${problemHtml(shown.problem)}${linesHtml(session)} ${isHold ? hold : null}
    <form method="post" action="/pay/${session.id}" novalidate>
      ${cardFieldsHtml(shown.typed, shown.errors)}
      <div class="acts"><button type="submit">${act}</button>${back}</div>
    </form>
    ${practiceCardsHtml}`
  const status = shown.problem === null ? 200 : Object.keys(shown.errors).length > 0 ? 422 : 402
  return page({ title: act, status, body, leadsTo: [session.successUrl] })
}

function closedPage(session: SessionRow): Answer {
  if (session.status === 'complete') {
    const body = html`${practiceNote}
      <h1>This is paid</h1>
      ${linesHtml(session)}
      <p class="acts"><a class="button" href="${successAddress(session)}">Go on</a></p>`
    return page({ title: 'Paid', body })
  }
  const back = session.cancelUrl
    ? html`<p class="acts"><a class="button" href="${session.cancelUrl}">Go back</a></p>`
    : null
  const body = html`${practiceNote}
    <h1>This payment page has closed</h1>
    <p>Its time was up or it was called off. Nothing was charged.</p>
    ${back}`
  return page({ title: 'Closed', status: 410, body })
}

export function showCheckout(turn: Turn, id: string): Answer {
  const session = turn.draft.get('sessions', id)
  if (!session) return lostPage()
  if (session.status !== 'open') return closedPage(session)
  const payment = session.paymentId === null ? undefined : turn.draft.get('payments', session.paymentId)
  return openPage(session, { typed: emptyCard, errors: {}, problem: payment?.lastDecline?.message ?? null })
}

export function submitCheckout(turn: Turn, id: string, form: Form): Answer {
  const session = turn.draft.get('sessions', id)
  if (!session) return lostPage()
  // Pressed twice: the second click goes where the first one went.
  if (session.status === 'complete') return redirect(successAddress(session))
  if (session.status !== 'open') return closedPage(session)
  const typed = typedCardOf(form)
  const read = readCard(typed, new Date(turn.nowS * 1000))
  if ('errors' in read) {
    const count = Object.keys(read.errors).length
    const problem = count === 1 ? 'One field needs another look.' : `${count} fields need another look.`
    return openPage(session, { typed, errors: read.errors, problem })
  }
  const payment = paySession(turn, session, read.card)
  if (payment.status === 'requires_action') return redirect(`/challenge/${payment.id}`)
  if (payment.lastDecline)
    return openPage(session, { typed, errors: {}, problem: payment.lastDecline.message })
  return redirect(successAddress(session))
}
