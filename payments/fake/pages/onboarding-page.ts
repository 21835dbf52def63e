import { changeAccount, finishOnboarding } from '../acts/change-account'
import type { AccountLinkRow, AccountRow } from '../books/rows'
import type { Answer } from '../http/answer'
import { textOf, type Form } from '../http/form'
import type { Turn } from '../turn'
import { lostPage, page, practiceNote, redirect } from './frame'
import { html } from './html'

function find(turn: Turn, id: string): { link: AccountLinkRow; account: AccountRow } | null {
  const link = turn.draft.get('accountLinks', id)
  const account = link && turn.draft.get('accounts', link.accountId)
  return link && account ? { link, account } : null
}

function isSpent(turn: Turn, link: AccountLinkRow): boolean {
  return link.used || link.expiresAtS <= turn.nowS
}

export function showOnboarding(turn: Turn, id: string): Answer {
  const found = find(turn, id)
  if (!found) return lostPage()
  const { link, account } = found
  if (isSpent(turn, link)) return redirect(link.refreshUrl)
  const who = account.businessName ?? account.email ?? account.id
  const body = html`${practiceNote}
    <h1>Get ready to be paid</h1>
    <p>
      Payouts for <strong>${who}</strong>. The real card processor would now ask for your name, date of birth,
      address, the last digits of a tax number and a bank account. Here nothing is asked: choose how it ends.
    </p>
    <form method="post" action="/onboard/${link.id}">
      <div class="acts">
        <button type="submit" name="choice" value="finish">Finish</button>
        <button type="submit" name="choice" value="later" class="second">Leave for later</button>
      </div>
    </form>`
  return page({ title: 'Onboarding', body, leadsTo: [link.returnUrl, link.refreshUrl] })
}

export function submitOnboarding(turn: Turn, id: string, form: Form): Answer {
  const found = find(turn, id)
  if (!found) return lostPage()
  const { link, account } = found
  if (isSpent(turn, link)) return redirect(link.refreshUrl)
  turn.draft.put({ table: 'accountLinks', row: { ...link, used: true } })
  if (textOf(form, 'choice') === 'finish') finishOnboarding(turn, account)
  else changeAccount(turn, account, {})
  return redirect(link.returnUrl)
}
