import { useEffect, useState } from 'react'
import { View } from 'react-native'

import { ordersWords, takeDownChoices, takeDownReasonOf } from './report-words'
import { useSendKey } from './use-send-key'

import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { focusElement } from '@/components/ui/focus-element'
import { RadioGroup } from '@/components/ui/radio-group'
import { Sheet } from '@/components/ui/sheet'
import { Text } from '@/components/ui/text'
import { TextArea } from '@/components/ui/text-area'
import { useToast } from '@/components/ui/toast'
import { useDismissReports, useReportedListings, useTakeDownListing } from '@/hooks/use-reported-listings'
import { Problem } from '@/shared/api/problem'
import type { ReportedListing } from '@/shared/contracts/listing-reports'
import type { TakeDownReason } from '@/shared/domain/listings/take-down-reasons'

export type ReportAct = 'dismiss' | 'take-down'

const words = {
  dismiss: {
    title: 'Nothing wrong',
    act: 'Close the reports',
    busy: 'Closing',
    effect: 'All its open reports are closed, and it stays on sale. The seller hears nothing of them.',
    done: 'Closed',
    note: 'A note for the desk',
    hint: 'Only moderators read it.',
  },
  'take-down': {
    title: 'Take off sale',
    act: 'Take it off sale',
    busy: 'Taking it off',
    effect:
      'It is gone from search and its page at once, for good. The seller gets the reason and your words by mail, never who reported.',
    done: 'Off sale',
    note: 'Words to the seller',
    hint: 'They read it as you write it.',
  },
} as const

interface Props {
  act: ReportAct
  listing: ReportedListing
  onClose: () => void
}

/** One decision about a reported listing: mounted when it is begun. */
export function ReportSheet({ act, listing, onClose }: Props) {
  const toast = useToast()
  const { refetch } = useReportedListings()
  const dismiss = useDismissReports(listing.listingId)
  const takeDown = useTakeDownListing(listing.listingId)
  const [reason, setReason] = useState<TakeDownReason | ''>('')
  const [note, setNote] = useState('')
  const [isTried, setIsTried] = useState(false)
  const isTakeDown = act === 'take-down'
  const said = words[act]
  const needsNote = isTakeDown && reason === 'other'
  const reasonFault = isTakeDown && !reason ? 'A reason goes with it.' : undefined
  const noteFault = needsNote && !note.trim() ? 'Say why it goes off sale.' : undefined
  const { isPending: isBusy, error } = isTakeDown ? takeDown : dismiss

  useEffect(() => {
    focusElement(isTakeDown ? 'report-keys' : 'report-act')
  }, [isTakeDown])

  const ends = {
    onSuccess: () => {
      toast({ tone: 'safe', text: `${said.done}: ${listing.title}` })
      onClose()
    },
    onError: (fault: Error) => {
      if (!(fault instanceof Problem) || fault.slug !== 'version-stale') return
      toast({ tone: 'danger', text: fault.message })
      void refetch()
      onClose()
    },
  }
  function send() {
    setIsTried(true)
    if (isBusy || reasonFault || noteFault) return
    const given = note.trim() ? { note: note.trim() } : {}
    if (isTakeDown && reason) takeDown.mutate({ reason, ...given }, ends)
    else dismiss.mutate({ seenUntil: listing.newestAt, ...given }, ends)
  }
  useSendKey(send)

  return (
    <Sheet
      title={`${said.title}: ${listing.title}`}
      isOpen
      onClose={onClose}
      shape="dialog"
      footer={
        <Button
          nativeID="report-act"
          kind={isTakeDown ? 'danger' : 'primary'}
          label={said.act}
          busyLabel={said.busy}
          isBusy={isBusy}
          isWide
          onPress={send}
        />
      }
    >
      {error ? (
        <Banner tone="danger" title="Not decided" isLive>
          {error.message}
        </Banner>
      ) : null}
      <Text>{said.effect}</Text>
      {isTakeDown ? (
        <>
          <Text>{ordersWords(listing.openOrders)}</Text>
          <View
            nativeID="report-keys"
            tabIndex={-1}
            onKeyDown={({ nativeEvent }) => {
              const chosen = takeDownReasonOf(nativeEvent.key)
              if (chosen) setReason(chosen)
            }}
          >
            <RadioGroup
              label="Reason"
              hint="Number keys choose."
              value={reason}
              choices={takeDownChoices}
              onChange={setReason}
              error={isTried ? reasonFault : undefined}
            />
          </View>
        </>
      ) : null}
      <TextArea
        label={said.note}
        hint={said.hint}
        isOptional={!needsNote}
        value={note}
        onChangeText={setNote}
        rows={3}
        maxLength={600}
        error={isTried ? noteFault : undefined}
      />
    </Sheet>
  )
}
