import { useWatch } from 'react-hook-form'

import { Fold } from './fold'

import { BoundChoice } from '@/components/forms/bound/bound-choice'
import { BoundText } from '@/components/forms/bound/bound-text'
import { FieldCell, FieldRow } from '@/components/forms/form-group'

import type { SupplyTyping } from './supply-typing'

const places = [
  { value: 'farm-gate', label: 'At my place' },
  { value: 'public-place', label: 'At a public place', hint: 'You agree on it in the order, by daylight.' },
]
const answers = [
  { value: 'instant', label: 'Take orders at once' },
  { value: 'ask', label: 'I answer each request', hint: 'You have 48 hours to say yes.' },
]
const balances = [
  { value: 'at-handover', label: 'When they collect', hint: 'On their phone, before you hand it over.' },
  { value: 'before', label: 'Before they come' },
]

/** Place, answer, deposit and cancelling: the usual terms in one line, each of them behind one tap. */
export function TermsFields() {
  const [placeKind, accept, depositPct, hours, perBuyer, balanceDue] = useWatch<
    SupplyTyping,
    ['placeKind', 'accept', 'depositPct', 'freeCancelHours', 'mostPerBuyer', 'balanceDue']
  >({
    name: ['placeKind', 'accept', 'depositPct', 'freeCancelHours', 'mostPerBuyer', 'balanceDue'],
  })
  const isWhole = depositPct.trim() === '100'
  const isUnclear = !placeKind || !accept || !balanceDue || !depositPct || !hours
  const summary = [
    placeKind === 'public-place' ? 'At a public place' : 'At your place',
    accept === 'instant' ? 'orders taken at once' : 'you answer each request',
    isWhole ? 'paid in full when ordered' : `${depositPct} % deposit`,
    `free to cancel until ${hours} hours before`,
    ...(perBuyer ? [`at most ${perBuyer} a buyer`] : []),
  ].join(', ')
  return (
    <Fold label="the terms" summary={`${summary}.`} isOpenFirst={isUnclear}>
      <BoundChoice<SupplyTyping> name="placeKind" label="Where do people collect?" choices={places} />
      <BoundChoice<SupplyTyping> name="accept" label="How do you take orders?" choices={answers} />
      <FieldRow>
        <FieldCell>
          <BoundText<SupplyTyping> name="depositPct" label="Paid when ordered" suffix="%" isFigure />
        </FieldCell>
        <FieldCell>
          <BoundText<SupplyTyping>
            name="freeCancelHours"
            label="Free to cancel until"
            suffix="hours before"
            isFigure
          />
        </FieldCell>
        <FieldCell>
          <BoundText<SupplyTyping> name="mostPerBuyer" label="Most for one buyer" isOptional isFigure />
        </FieldCell>
      </FieldRow>
      {isWhole ? null : (
        <BoundChoice<SupplyTyping> name="balanceDue" label="When is the rest paid?" choices={balances} />
      )}
    </Fold>
  )
}
