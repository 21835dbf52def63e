import { useRouter } from 'expo-router'
import { useState } from 'react'

import { DecisionBar } from './decision-bar'
import { DecisionSheet } from './decision-sheet'
import { decisionWords, type DecisionKind } from './decision-words'
import { KeysSheet } from './keys-sheet'
import { neighboursOf } from './neighbours'
import { ReviewPage } from './review-page'
import { useDeskKeys } from './use-desk-keys'

import { focusElement } from '@/components/ui/focus-element'
import { useToast } from '@/components/ui/toast'
import { useBreakpoint } from '@/hooks/use-breakpoint'
import { useDecideReview, useReviewQueue, type Decision } from '@/hooks/use-moderation'
import { newRequestKey } from '@/hooks/request-key'
import { Problem } from '@/shared/api/problem'
import type { Review } from '@/shared/contracts/moderation'

interface Props {
  review: Review
  onReload: () => void
}

/** One version on the desk: read, decide, go on to the next. */
export function ReviewDesk({ review, onReload }: Props) {
  const router = useRouter()
  const toast = useToast()
  const isPhone = useBreakpoint() === 'phone'
  const decide = useDecideReview(review.versionId)
  const queue = useReviewQueue()
  const [kind, setKind] = useState<DecisionKind | null>(null)
  const [hasKeys, setHasKeys] = useState(false)
  const ids = (queue.data?.pages ?? []).flatMap((page) => page.items.map((row) => row.versionId))
  const { previous, next } = neighboursOf(review.versionId, ids, review.nextVersionId)
  const isOpen = review.review === 'waiting'

  const show = (versionId: string | undefined) =>
    versionId
      ? router.replace({ pathname: '/moderate/listings/[versionId]', params: { versionId } })
      : router.replace('/moderate')
  const begin = (wanted: DecisionKind) => {
    decide.reset()
    setKind(wanted)
  }
  function send(decision: Decision) {
    decide.mutate(
      { decision, key: newRequestKey() },
      {
        onSuccess: (decided) => {
          setKind(null)
          toast({ tone: 'safe', text: `${decisionWords[decision.decision].done}: ${review.title}` })
          show(decided.nextVersionId)
        },
        onError: (error) => {
          if (!(error instanceof Problem) || error.slug !== 'version-stale') return
          setKind(null)
          toast({ tone: 'danger', text: error.message })
          onReload()
        },
      },
    )
  }
  const acts = isOpen ? { a: () => begin('approve'), s: () => begin('ask'), r: () => begin('reject') } : {}
  const step = { j: () => next && show(next), n: () => next && show(next) }
  const back = { k: () => previous && show(previous), p: () => previous && show(previous) }
  const others = { d: () => focusElement('diff'), u: () => show(undefined), '?': () => setHasKeys(true) }
  useDeskKeys({ ...acts, ...step, ...back, ...others }, kind === null && !hasKeys)

  const bar = isOpen ? <DecisionBar onDecide={begin} hasKeys={!isPhone} /> : null
  return (
    <>
      <ReviewPage
        review={review}
        decision={bar}
        previous={previous}
        next={next}
        onShow={show}
        onKeys={() => setHasKeys(true)}
        onReload={onReload}
      />
      {kind ? (
        <DecisionSheet
          kind={kind}
          title={review.title}
          isBusy={decide.isPending}
          refusal={decide.error?.message ?? null}
          onSend={send}
          onClose={() => setKind(null)}
        />
      ) : null}
      <KeysSheet isOpen={hasKeys} onClose={() => setHasKeys(false)} />
    </>
  )
}
