import { useEffect, useState } from 'react'
import { View } from 'react-native'

import {
  decisionWords,
  reasonOfKey,
  reasonChoices,
  type DecisionKind,
  type ReviewReason,
} from './decision-words'
import { useSendKey } from './use-send-key'

import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { focusElement } from '@/components/ui/focus-element'
import { RadioGroup } from '@/components/ui/radio-group'
import { Sheet } from '@/components/ui/sheet'
import { Text } from '@/components/ui/text'
import { TextArea } from '@/components/ui/text-area'
import type { Decision } from '@/hooks/use-moderation'

interface Props {
  kind: DecisionKind
  title: string
  isBusy: boolean
  /** What the server said against it. */
  refusal: string | null
  onSend: (decision: Decision) => void
  onClose: () => void
}

/** One decision: mounted when it is begun, so that nothing of the last one hangs over. */
export function DecisionSheet({ kind, title, isBusy, refusal, onSend, onClose }: Props) {
  const [reason, setReason] = useState<ReviewReason | ''>('')
  const [note, setNote] = useState('')
  const [isTried, setIsTried] = useState(false)
  const words = decisionWords[kind]
  const isApproval = kind === 'approve'
  const needsNote = kind === 'ask' || reason === 'other'
  const reasonFault = !isApproval && !reason ? 'A reason goes with it.' : undefined
  const noteFault = !isApproval && needsNote && !note.trim() ? 'Say what the seller should do.' : undefined

  useEffect(() => {
    focusElement(isApproval ? 'decision-act' : 'decision-keys')
  }, [isApproval])

  function send() {
    setIsTried(true)
    if (isBusy || reasonFault || noteFault) return
    const given = note.trim() ? { note: note.trim() } : {}
    onSend(isApproval || !reason ? { decision: 'approve' } : { decision: kind, reason, ...given })
  }
  useSendKey(send)

  return (
    <Sheet
      title={`${words.title}: ${title}`}
      isOpen
      onClose={onClose}
      shape="dialog"
      footer={
        <Button
          nativeID="decision-act"
          kind={kind === 'reject' ? 'danger' : 'primary'}
          label={words.act}
          busyLabel={words.busy}
          isBusy={isBusy}
          isWide
          onPress={send}
        />
      }
    >
      {refusal ? (
        <Banner tone="danger" title="Not decided" isLive>
          {refusal}
        </Banner>
      ) : null}
      <Text>{words.effect}</Text>
      {isApproval ? null : (
        <>
          <View
            nativeID="decision-keys"
            tabIndex={-1}
            onKeyDown={({ nativeEvent }) => {
              const chosen = reasonOfKey(nativeEvent.key)
              if (chosen) setReason(chosen)
            }}
          >
            <RadioGroup
              label="Reason"
              hint="Number keys choose."
              value={reason}
              choices={reasonChoices}
              onChange={setReason}
              error={isTried ? reasonFault : undefined}
            />
          </View>
          <TextArea
            label="Words to the seller"
            hint="What should they do? They read it as you write it."
            isOptional={!needsNote}
            value={note}
            onChangeText={setNote}
            rows={3}
            maxLength={600}
            error={isTried ? noteFault : undefined}
          />
        </>
      )}
    </Sheet>
  )
}
