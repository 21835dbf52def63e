import type { Href } from 'expo-router'
import { useState } from 'react'
import { View } from 'react-native'

import { ReportSheet } from './report-sheet'

import { Button } from '@/components/ui/button'
import { ButtonLink } from '@/components/ui/button-link'
import { Banner } from '@/components/ui/banner'
import { useMe } from '@/hooks/use-me'
import type { ShownListing } from '@/shared/contracts/listings'

/** The way to tell the moderators what is wrong here; a visitor signs in first and comes back. */
export function ReportListing({ listing }: { listing: ShownListing }) {
  const { me } = useMe()
  const [isOpen, setIsOpen] = useState(false)
  const [isSent, setIsSent] = useState(false)
  const { listingId, may } = listing
  if (!may.includes('report')) return null
  if (isSent) {
    return (
      <Banner tone="safe" title="Thank you: you have reported this" isLive>
        A moderator looks at it. The grower never learns who reported.
      </Banner>
    )
  }
  const signIn: Href = { pathname: '/sign-in', params: { returnTo: `/listings/${listingId}` } }
  return (
    <View>
      {me === null ? (
        <ButtonLink
          kind="quiet"
          icon="warn"
          label="Report this listing"
          spokenLabel="Report this listing: sign in first"
          href={signIn}
        />
      ) : (
        <Button kind="quiet" icon="warn" label="Report this listing" onPress={() => setIsOpen(true)} />
      )}
      {isOpen ? (
        <ReportSheet
          listing={listing}
          onClose={() => setIsOpen(false)}
          onSent={() => {
            setIsOpen(false)
            setIsSent(true)
          }}
        />
      ) : null}
    </View>
  )
}
