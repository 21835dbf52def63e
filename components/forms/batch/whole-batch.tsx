import { StyleSheet, View } from 'react-native'

import { BatchErrors } from './batch-errors'
import { BatchGroup } from './batch-group'
import { batchSteps } from './batch-steps'
import { PublishPanel } from './publish-panel'
import { StaleBanner } from './stale-banner'
import { titleOfBatch } from './title-of-batch'

import { Page } from '@/components/layout/page'
import { space } from '@/constants/theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'

import type { BatchDeskProps } from './batch-desk-props'

/** The whole form, with the tag beside it where there is room. */
export function WholeBatch(desk: BatchDeskProps) {
  const isWide = useBreakpoint() === 'wide'
  const { own, setting, publishing } = desk
  return (
    <Page
      title={titleOfBatch(own)}
      intro={
        own.liveVersion === undefined ? 'About five minutes. The tag shows what buyers will see.' : undefined
      }
      back={{ label: 'Back to selling', href: '/sell' }}
      width={isWide ? 'page' : 'readable'}
    >
      <StaleBanner {...desk} />
      <View style={isWide ? styles.row : styles.column}>
        <View style={[styles.groups, isWide ? styles.grow : null]}>
          <BatchErrors attempt={publishing.attempt} trouble={publishing.trouble} />
          {batchSteps.map((step) => (
            <BatchGroup key={step.id} stepId={step.id} setting={setting} />
          ))}
        </View>
        <View role="complementary" aria-label="Preview and publishing" style={isWide ? styles.side : null}>
          <PublishPanel {...desk} />
        </View>
      </View>
    </Page>
  )
}

// Stays in view while the questions scroll; the native app has no wide screen with its own scrolling column.
const sticky = { position: 'sticky', top: space.lg } as object

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'flex-start', gap: space.xl },
  column: { gap: space.lg },
  groups: { gap: space.lg },
  grow: { flex: 1, minWidth: 0 },
  side: { width: 340, ...sticky },
})
