import { useFormState } from 'react-hook-form'

import { LiveNote } from './live-note'

import { BoundArea } from '@/components/forms/bound/bound-area'

import type { SupplyTyping } from './supply-typing'

/** Free words, with what they claim that the answers do not carry. */
export function WordsField({ caution }: { caution?: string }) {
  const { errors } = useFormState<SupplyTyping>({ name: 'words' })
  return (
    <>
      <BoundArea<SupplyTyping>
        name="words"
        label="In your own words"
        hint="No phone numbers or addresses: those come with the order."
        isOptional
        rows={2}
        maxLength={2000}
      />
      <LiveNote words={errors.words ? null : caution} tone="caution" />
    </>
  )
}
