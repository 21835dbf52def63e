import { useState } from 'react'

import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { RadioGroup } from '@/components/ui/radio-group'
import { Sheet } from '@/components/ui/sheet'
import { Text } from '@/components/ui/text'
import { TextArea } from '@/components/ui/text-area'
import { newRequestKey } from '@/hooks/request-key'
import { useReportListing, type ListingReport } from '@/hooks/use-report-listing'
import type { ShownListing } from '@/shared/contracts/listings'

import type { Choice } from '@/components/ui/choice'

type Reason = ListingReport['reason']

const reasons: readonly Choice<Reason>[] = [
  { value: 'species', label: 'Wrong species, or an animal that may not be listed' },
  { value: 'not-as-told', label: 'It is not what it says' },
  { value: 'bad-state', label: 'The animals are in a bad state' },
  { value: 'unlawful', label: 'The offer is unsafe or unlawful' },
  { value: 'contact-details', label: 'Contact details, or it goes around this site' },
  { value: 'other', label: 'Something else' },
]

interface Props {
  listing: ShownListing
  onClose: () => void
  onSent: () => void
}

/** Mounted when it is opened: one key for one report, however often it is sent. */
export function ReportSheet({ listing, onClose, onSent }: Props) {
  const [reason, setReason] = useState<Reason | ''>('')
  const [words, setWords] = useState('')
  const [isTried, setIsTried] = useState(false)
  const [key] = useState(newRequestKey)
  const report = useReportListing(listing.listingId)
  const needsWords = reason === 'other'
  const reasonFault = reason ? undefined : 'What is wrong? Choose the nearest.'
  const wordsFault = needsWords && !words.trim() ? 'Say in a sentence or two what is wrong.' : undefined

  function send() {
    setIsTried(true)
    if (!reason || wordsFault) return
    const said = words.trim() ? { words: words.trim() } : {}
    report.mutate({ report: { reason, ...said }, key }, { onSuccess: onSent })
  }
  return (
    <Sheet
      title="Report this listing"
      isOpen
      onClose={onClose}
      shape="dialog"
      footer={
        <Button label="Send the report" busyLabel="Sending" isBusy={report.isPending} isWide onPress={send} />
      }
    >
      {report.error ? (
        <Banner tone="danger" title="Not sent" isLive>
          {`${report.error.message.replace(/\.?$/, '.')} Your words are still here.`}
        </Banner>
      ) : null}
      <Text>A moderator reads it. The grower never learns who reported.</Text>
      <RadioGroup
        label="What is wrong?"
        value={reason}
        choices={reasons}
        onChange={setReason}
        error={isTried ? reasonFault : undefined}
      />
      <TextArea
        label="In your words"
        hint="What did you see, and where?"
        isOptional={!needsWords}
        value={words}
        onChangeText={setWords}
        rows={3}
        maxLength={600}
        error={isTried ? wordsFault : undefined}
      />
    </Sheet>
  )
}
