import type { Answer } from '../http/answer'
import { platformBalance } from '../objects/balance'
import type { Turn } from '../turn'
import { page, practiceNote } from './frame'
import { dollars, html, type Html } from './html'

const SHOWN = 25

function when(seconds: number): string {
  return `${new Date(seconds * 1000).toISOString().slice(0, 19).replace('T', ' ')} UTC`
}

function newest<R>(rows: R[]): R[] {
  return rows.slice(-SHOWN).reverse()
}

interface Table {
  caption: string
  heads: string[]
  rows: (Html | number | string)[][]
}

function tableHtml({ caption, heads, rows }: Table): Html {
  if (rows.length === 0)
    return html`<h2>${caption}</h2>
      <p>None yet.</p>`
  const head = heads.map((text) => html`<th scope="col">${text}</th>`)
  const lines = rows.map(
    (cells) =>
      html`<tr>
        ${cells.map((cell) => html`<td>${cell}</td>`)}
      </tr>`,
  )
  return html`<div class="scroll" role="region" aria-label="${caption}" tabindex="0">
    <table>
      <caption>
        ${caption}
      </caption>
      <thead>
        <tr>
          ${head}
        </tr>
      </thead>
      <tbody>
        ${lines}
      </tbody>
    </table>
  </div>`
}

function paymentsTable({ draft }: Turn): Table {
  return {
    caption: 'Latest payments',
    heads: ['Payment', 'When', 'Amount', 'State', 'For'],
    rows: newest(draft.all('payments')).map((row) => [
      html`<code>${row.id}</code>`,
      when(row.createdS),
      dollars(row.amount),
      row.status,
      row.description ?? '',
    ]),
  }
}

function pagesTable({ draft }: Turn): Table {
  return {
    caption: 'Open payment pages',
    heads: ['Page', 'Open until', 'For'],
    rows: newest(draft.all('sessions').filter((row) => row.status === 'open')).map((row) => [
      html`<a href="/pay/${row.id}">${row.id}</a>`,
      when(row.expiresAtS),
      row.lines.map((line) => line.name).join(', '),
    ]),
  }
}

function accountsTable({ draft }: Turn): Table {
  return {
    caption: 'Connected accounts',
    heads: ['Account', 'Who', 'Payouts', 'Balance'],
    rows: newest(draft.all('accounts')).map((row) => [
      html`<code>${row.id}</code>`,
      row.businessName ?? row.email ?? '',
      row.payoutsEnabled ? 'enabled' : 'not enabled',
      dollars(row.balance),
    ]),
  }
}

function eventsTable({ draft }: Turn): Table {
  return {
    caption: 'Latest events',
    heads: ['Event', 'When', 'Type', 'Webhook'],
    rows: newest(draft.all('events')).map((row) => {
      const delivery = draft.get('deliveries', row.id)
      const state = delivery ? `${delivery.state}, ${delivery.attempts} tries` : 'not sent anywhere'
      return [html`<code>${row.id}</code>`, when(row.createdS), row.type, state]
    }),
  }
}

/** For whoever develops: what the practice processor has seen lately. */
export function showIndex(turn: Turn): Answer {
  const { availableCents, pendingCents } = platformBalance(turn)
  const { platformOrigin } = turn.world.settings
  const body = html`${practiceNote}
    <h1>What happened lately</h1>
    <dl>
      <div>
        <dt>Time here</dt>
        <dd>${when(turn.nowS)}</dd>
      </div>
      <div>
        <dt>Platform balance, to use now</dt>
        <dd>${dollars(availableCents)}</dd>
      </div>
      <div>
        <dt>Platform balance, on its way</dt>
        <dd>${dollars(pendingCents)}</dd>
      </div>
    </dl>
    <p><a href="${platformOrigin}">Go to the platform</a></p>
    ${[pagesTable(turn), paymentsTable(turn), accountsTable(turn), eventsTable(turn)].map(tableHtml)}`
  return page({ title: 'What happened lately', body, isWide: true })
}
