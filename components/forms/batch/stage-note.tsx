import { useWatch } from 'react-hook-form'

import { Text } from '@/components/ui/text'
import { stages } from '@/shared/domain/species/stages.facts'

import type { BatchTyping } from './batch-typing'

/** What the chosen stage usually means: sellers stretch these words, so the inches always stand beside them. */
export function StageNote() {
  const stageId = useWatch<BatchTyping, 'stage'>({ name: 'stage' })
  const stage = stages.find((one) => one.id === stageId)
  if (!stage) return null
  return (
    <Text size="note" tint="muted" role="status">
      {stage.meaning}
    </Text>
  )
}
