import { useState } from 'react'

import { NumberField } from '@/components/ui/number-field'

interface Props {
  label: string
  hint?: string
  prefix?: string
  placeholder?: string
  /** The value in use as text; '' for none. */
  shown: string
  /** null: not readable. */
  read: (text: string) => number | null
  /** What to say when it cannot be read: "A length, like 2 1/4 in". */
  unreadable: string
  onCommit: (value: number | undefined) => void
}

/** Takes effect when the typing is done: on Enter, or when the field is left. */
export function CommittedField({ shown, read, unreadable, onCommit, ...field }: Props) {
  const [typed, setTyped] = useState<string | null>(null)
  const [isUnreadable, setIsUnreadable] = useState(false)
  function commit() {
    if (typed === null || typed === shown) {
      setTyped(null)
      return
    }
    const value = typed.trim() === '' ? undefined : read(typed)
    if (value === null) {
      setIsUnreadable(true)
      return
    }
    setTyped(null)
    onCommit(value)
  }
  return (
    <NumberField
      {...field}
      value={typed ?? shown}
      error={isUnreadable ? unreadable : undefined}
      enterKeyHint="done"
      onChangeText={(text) => {
        setTyped(text)
        setIsUnreadable(false)
      }}
      onBlur={commit}
      onSubmitEditing={commit}
    />
  )
}
