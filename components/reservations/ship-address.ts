import type { FormError } from '@/components/ui/error-summary'
import type { ShipAddress } from '@/shared/contracts/shipments'

/** An address as it is typed; '' is not answered yet. */
export type AddressTyping = ShipAddress

export const blankAddress = (zip: string, state: string): AddressTyping => ({
  name: '',
  street: '',
  city: '',
  state,
  zip,
  phone: '',
})

export const isZip = (text: string) => /^\d{5}$/.test(text)

interface Rule {
  part: keyof AddressTyping
  isGood: (text: string) => boolean
  message: string
}

// The rules and words of the wire contract; the server asks them again.
const rules: readonly Rule[] = [
  {
    part: 'name',
    isGood: (text) => text.length >= 2 && text.length <= 80,
    message: 'Whose name is on the door?',
  },
  {
    part: 'street',
    isGood: (text) => text.length >= 3 && text.length <= 120,
    message: 'Street and number.',
  },
  { part: 'city', isGood: (text) => text.length >= 2 && text.length <= 64, message: 'Which town?' },
  { part: 'state', isGood: (text) => /^[A-Z]{2}$/.test(text), message: 'Which state?' },
  { part: 'zip', isGood: isZip, message: 'The ZIP code: five digits, please.' },
  {
    part: 'phone',
    isGood: (text) => /^[0-9+() .-]{7,24}$/.test(text),
    message: 'A phone number that the carrier can ring.',
  },
]

export function shipAddressErrors(address: AddressTyping): FormError[] {
  return rules
    .filter(({ part, isGood }) => !isGood(address[part].trim()))
    .map(({ part, message }) => ({ fieldId: `ship-${part}`, message }))
}

export function trimmedAddress({ name, street, city, state, zip, phone }: AddressTyping): ShipAddress {
  return {
    name: name.trim(),
    street: street.trim(),
    city: city.trim(),
    state,
    zip: zip.trim(),
    phone: phone.trim(),
  }
}
