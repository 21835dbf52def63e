import { testCards } from '../test-cards.facts'
import { textOf, type Form } from '../http/form'
import { cardFromEntry, type CardUsed } from '../card-used'
import { html, type Html } from './html'

export type FieldName = 'cardNumber' | 'expiry' | 'cvc' | 'name'

export interface TypedCard {
  cardNumber: string
  expiry: string
  cvc: string
  name: string
}

export type FieldErrors = Partial<Record<FieldName, string>>

export const emptyCard: TypedCard = { cardNumber: '', expiry: '', cvc: '', name: '' }

export function typedCardOf(form: Form): TypedCard {
  const field = (name: FieldName) => (textOf(form, name) ?? '').trim()
  return { cardNumber: field('cardNumber'), expiry: field('expiry'), cvc: field('cvc'), name: field('name') }
}

/** "12/30", "12 / 2030" or "1230" -> month and full year; null for anything else. */
function readExpiry(text: string): { month: number; year: number } | null {
  const match = /^(\d{1,2})\s*[/\-. ]\s*(\d{4}|\d{2})$/.exec(text) ?? /^(\d{2})(\d{4}|\d{2})$/.exec(text)
  if (!match) return null
  const month = Number(match[1])
  const year = Number(match[2])
  if (month < 1 || month > 12) return null
  return { month, year: year < 100 ? 2000 + year : year }
}

/** What was typed as a card, or what has to be mended field by field. */
export function readCard(typed: TypedCard, now: Date): { card: CardUsed } | { errors: FieldErrors } {
  const errors: FieldErrors = {}
  const number = typed.cardNumber.replace(/[\s-]/g, '')
  if (!/^\d{12,19}$/.test(number))
    errors.cardNumber = 'Type the 16 digits of one of the practice cards below.'
  const expiry = readExpiry(typed.expiry)
  if (!expiry) errors.expiry = 'Type month and year, like 12/34.'
  else if (expiry.year * 12 + expiry.month < now.getUTCFullYear() * 12 + now.getUTCMonth() + 1) {
    errors.expiry = 'This date is past. Type a date to come, like 12/34.'
  }
  if (!/^\d{3,4}$/.test(typed.cvc)) errors.cvc = 'Type three digits, like 123.'
  if (typed.name === '') errors.name = 'Type a name.'
  if (!expiry || Object.keys(errors).length > 0) return { errors }
  return { card: cardFromEntry({ number, expMonth: expiry.month, expYear: expiry.year, holder: typed.name }) }
}

interface Field {
  name: FieldName
  label: string
  hint: string
  isNumeric: boolean
}

const numberField: Field = {
  name: 'cardNumber',
  label: 'Card number',
  hint: 'One that goes through: 4242 4242 4242 4242',
  isNumeric: true,
}
const expiryField: Field = { name: 'expiry', label: 'Expires', hint: 'Month / year', isNumeric: false }
const cvcField: Field = { name: 'cvc', label: 'Security code', hint: 'Any 3 digits', isNumeric: true }
const nameField: Field = { name: 'name', label: 'Name on the card', hint: 'Any name', isNumeric: false }

function fieldHtml(field: Field, value: string, error: string | undefined): Html {
  const { name } = field
  const wrong = error ? html`<span class="wrong" id="${name}-wrong">${error}</span>` : null
  const describedBy = error ? `${name}-hint ${name}-wrong` : `${name}-hint`
  // autocomplete off: the browser must not offer the real card it remembers.
  return html`<div class="field">
    <label for="${name}">${field.label}</label>
    <span class="hint" id="${name}-hint">${field.hint}</span>
    <input
      id="${name}"
      name="${name}"
      value="${value}"
      autocomplete="off"
      spellcheck="false"
      required
      inputmode="${field.isNumeric ? 'numeric' : 'text'}"
      aria-describedby="${describedBy}"
      aria-invalid="${error ? 'true' : 'false'}"
    />${wrong}
  </div>`
}

/** Only a practice number is ever written back into the page. */
function shownNumber(typed: string): string {
  const digits = typed.replace(/[\s-]/g, '')
  return testCards.some((card) => card.number === digits) ? typed : ''
}

export function cardFieldsHtml(typed: TypedCard, errors: FieldErrors): Html {
  return html`${fieldHtml(numberField, shownNumber(typed.cardNumber), errors.cardNumber)}
    <div class="pair">
      ${fieldHtml(expiryField, typed.expiry, errors.expiry)}${fieldHtml(cvcField, typed.cvc, errors.cvc)}
    </div>
    ${fieldHtml(nameField, typed.name, errors.name)}`
}

export const practiceCardsHtml = html`<details>
  <summary>Practice cards and what they do</summary>
  <dl class="cards">
    ${testCards.map(
      (card) =>
        html`<div>
          <dt>${card.means}</dt>
          <dd><code>${card.number.replace(/(\d{4})(?=\d)/g, '$1 ')}</code></dd>
        </div>`,
    )}
  </dl>
</details>`
