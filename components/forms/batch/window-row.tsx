import { useWatch } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { BoundDay } from '@/components/forms/bound/bound-day'
import { BoundText } from '@/components/forms/bound/bound-text'
import { FieldCell, FieldRow } from '@/components/forms/form-group'
import { printDay, printTime } from '@/components/forms/day-text'
import { Button } from '@/components/ui/button'
import { Text } from '@/components/ui/text'
import { color, radius, space } from '@/constants/theme'

import type { BatchTyping, WindowTyping } from './batch-typing'

interface Props {
  at: number
  onRepeat: () => void
  onRemove: () => void
}

export function WindowRow({ at, onRepeat, onRemove }: Props) {
  const window = useWatch<BatchTyping, `windows.${number}`>({ name: `windows.${at}` })
  const words = windowWords(window)
  const named = words || `window ${at + 1}`
  return (
    <View role="group" aria-label={`Pickup window ${at + 1}`} style={styles.row}>
      {words ? (
        <Text size="note" face="strong">
          {words}
        </Text>
      ) : null}
      <FieldRow>
        <FieldCell minPx={160}>
          <BoundDay<BatchTyping> name={`windows.${at}.day`} label="Day" />
        </FieldCell>
        <FieldCell minPx={120}>
          <BoundDay<BatchTyping> name={`windows.${at}.from`} label="From" isTime />
        </FieldCell>
        <FieldCell minPx={120}>
          <BoundDay<BatchTyping> name={`windows.${at}.until`} label="Until" isTime />
        </FieldCell>
        <FieldCell minPx={84}>
          <BoundText<BatchTyping> name={`windows.${at}.capacity`} label="Buyers" isFigure />
        </FieldCell>
      </FieldRow>
      <View style={styles.acts}>
        <Button
          kind="quiet"
          icon="calendar"
          label="Same next week"
          spokenLabel={`Same next week: ${named}`}
          onPress={onRepeat}
        />
        <Button kind="quiet" icon="trash" label="Remove" spokenLabel={`Remove ${named}`} onPress={onRemove} />
      </View>
    </View>
  )
}

function windowWords(window: WindowTyping | undefined): string {
  if (!window) return ''
  const [day, from, until] = [printDay(window.day), printTime(window.from), printTime(window.until)]
  return day && from && until ? `${day}, ${from} to ${until}` : day
}

const styles = StyleSheet.create({
  row: {
    gap: space.md,
    padding: space.md,
    paddingBottom: space.xs,
    borderRadius: radius.tag,
    borderWidth: 1,
    borderColor: color.line,
  },
  acts: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    marginHorizontal: -space.sm,
  },
})
