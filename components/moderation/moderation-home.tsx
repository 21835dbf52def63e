import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { KeysSheet } from './keys-sheet'
import { ReportSheet, type ReportAct } from './report-sheet'
import { ReportedList } from './reported-list'
import { ReviewQueue } from './review-queue'
import { stepThrough } from './step-through'
import { useDeskKeys } from './use-desk-keys'

import { ButtonLink } from '@/components/ui/button-link'
import { space } from '@/constants/theme'
import type { ReportedListing } from '@/shared/contracts/listing-reports'

const ROW = 'desk-row-'

/** Both lists of the desk under one set of keys: what waits for a decision, then what members report. */
export function ModerationHome() {
  const [hasKeys, setHasKeys] = useState(false)
  const [deciding, setDeciding] = useState<{ act: ReportAct; listing: ReportedListing } | null>(null)
  const [onRow, setOnRow] = useState<ReportedListing | null>(null)
  // Read once a drawing: ages are to the minute, and the lists are asked again when the page comes into view.
  const [nowMs] = useState(() => Date.now())
  const down = () => stepThrough(ROW, 1)
  const up = () => stepThrough(ROW, -1)
  const decide = (act: ReportAct) => () => onRow && setDeciding({ act, listing: onRow })
  useDeskKeys(
    {
      ...{ j: down, n: down, k: up, p: up, '?': () => setHasKeys(true) },
      ...(onRow ? { w: decide('dismiss'), t: decide('take-down') } : {}),
    },
    !hasKeys && deciding === null,
  )
  return (
    <View style={styles.frame}>
      <ReviewQueue nowMs={nowMs} onKeys={() => setHasKeys(true)} />
      <ReportedList
        nowMs={nowMs}
        onRow={setOnRow}
        onDecide={(act, listing) => setDeciding({ act, listing })}
      />
      <View>
        <ButtonLink
          kind="secondary"
          icon="calendar"
          href="/moderate/ship-days"
          label="Days without carriers"
          style={styles.link}
        />
      </View>
      {deciding ? (
        <ReportSheet act={deciding.act} listing={deciding.listing} onClose={() => setDeciding(null)} />
      ) : null}
      <KeysSheet isOpen={hasKeys} onClose={() => setHasKeys(false)} />
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.xl }, link: { alignSelf: 'flex-start' } })
