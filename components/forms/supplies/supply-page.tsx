import { StyleSheet, View } from 'react-native'

import { MediaGroups } from './media-groups'
import { ProduceGroups } from './produce-groups'
import { SupplyErrors } from './supply-errors'
import { WormGroups } from './worm-groups'

import { DiscardAct } from '@/components/forms/batch/discard-act'
import { DraftLine } from '@/components/forms/batch/draft-line'
import { StaleBanner } from '@/components/forms/batch/stale-banner'
import { Page } from '@/components/layout/page'
import { Button } from '@/components/ui/button'
import { Text } from '@/components/ui/text'
import { color, radius, space } from '@/constants/theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'

import type { SupplyKind } from './supply-kind'
import type { SupplySetting } from './supply-setting'
import type { usePublish } from '@/components/forms/batch/use-publish'
import type { DraftState } from '@/hooks/draft-keeper'
import type { OwnListing } from '@/shared/contracts/listings'

interface Props {
  kind: SupplyKind
  own: OwnListing
  setting: SupplySetting
  draftState: DraftState
  publishing: ReturnType<typeof usePublish>
  onLoadNewer: () => void
  onKeepMine: () => void
  onUnshelve?: () => void
}

const titles: Record<SupplyKind, string> = {
  produce: 'List produce',
  worms: 'List worms',
  media: 'List media',
}
const intros: Record<SupplyKind, string> = {
  produce: 'About two minutes: one crop of one harvest.',
  worms: 'About four minutes: one kind of worm, packed one way.',
  media: 'About three minutes: one material, in one kind of bag.',
}
const groups = { produce: ProduceGroups, worms: WormGroups, media: MediaGroups }

/** One page for all of it: there is too little to ask for steps. The main act stays in thumb reach on a phone. */
export function SupplyPage(props: Props) {
  const { kind, own, setting, draftState, publishing } = props
  const breakpoint = useBreakpoint()
  const isPhone = breakpoint === 'phone'
  const isWide = breakpoint === 'wide'
  const Groups = groups[kind]
  const isNew = own.liveVersion === undefined && own.review === undefined
  const acts = (
    <View style={styles.acts}>
      <DraftLine state={draftState} />
      <Button
        label={isNew ? 'Publish' : 'Publish the change'}
        isWide
        isBusy={publishing.isBusy}
        busyLabel="Publishing"
        isDisabled={!own.may.includes('submit')}
        onPress={() => void publishing.publish()}
      />
    </View>
  )
  const next = (
    <View style={styles.next}>
      <Text size="note" tint="muted">
        {kind === 'produce'
          ? 'Live at once, unless words or papers need a look first. It ends by itself on its last day of sale.'
          : 'A moderator may read it before others see it. You get a mail when it is live, or when something is asked.'}
      </Text>
      <DiscardAct own={own} />
    </View>
  )
  return (
    <Page
      title={isNew ? titles[kind] : `Change ${own.title}`}
      intro={isNew ? intros[kind] : undefined}
      back={{ label: 'Back to selling', href: '/sell' }}
      width={isWide ? 'page' : 'readable'}
      footer={isPhone ? acts : undefined}
    >
      <StaleBanner {...props} />
      <View style={isWide ? styles.row : styles.column}>
        <View style={[styles.groups, isWide ? styles.grow : null, isPhone ? styles.airy : null]}>
          <SupplyErrors attempt={publishing.attempt} trouble={publishing.trouble} />
          <Groups setting={setting} />
        </View>
        <View role="complementary" aria-label="Publishing" style={isWide ? styles.side : styles.below}>
          {isPhone ? null : acts}
          {next}
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
  airy: { gap: space.xxl },
  grow: { flex: 1, minWidth: 0 },
  side: {
    width: 320,
    gap: space.lg,
    padding: space.lg,
    borderWidth: 1,
    borderColor: color.line,
    borderRadius: radius.tag,
    backgroundColor: color.card,
    ...sticky,
  },
  below: { gap: space.lg },
  acts: { gap: space.sm },
  next: { gap: space.sm },
})
