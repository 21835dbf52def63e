import type { OwnSeller } from '@/shared/contracts/sellers'

export interface LicenceTyping {
  state: string
  answer: 'have' | 'not-needed' | 'unsure' | ''
  number: string
}

/** A farm as it stands in the form; '' is not answered yet. */
export interface FarmTyping {
  farmName: string
  about: string
  kind: OwnSeller['kind'] | ''
  street: string
  city: string
  state: string
  zip: string
  phone: string
  licences: LicenceTyping[]
}

export function farmTyping(farm: OwnSeller | null): FarmTyping {
  if (!farm) {
    return {
      ...{ farmName: '', about: '', kind: '', street: '', city: '', state: '', zip: '', phone: '' },
      licences: [],
    }
  }
  const { farmName, about, kind, street, city, state, zip, phone } = farm
  return {
    ...{ farmName, about, kind, street, city, state, zip, phone },
    licences: farm.licences.map((licence) => ({ ...licence, number: licence.number ?? '' })),
  }
}
