import { useState } from 'react'
import { useFormContext } from 'react-hook-form'

import { BatchErrors } from './batch-errors'
import { BatchGroup } from './batch-group'
import { batchSteps, checkStep, stepOfField } from './batch-steps'
import { CheckGroup } from './check-group'
import { StaleBanner } from './stale-banner'
import { StepErrors } from './step-errors'
import { StepFooter } from './step-footer'
import { titleOfBatch } from './title-of-batch'

import { nameOfFieldId } from '@/components/forms/field-id'
import { Page } from '@/components/layout/page'
import { focusElement } from '@/components/ui/focus-element'
import { Steps } from '@/components/ui/steps'

import type { BatchDeskProps } from './batch-desk-props'
import type { BatchTyping } from './batch-typing'

const titles = [...batchSteps.map((step) => step.title), 'Check and publish']
const groupIds = [...batchSteps.map((step) => step.id), 'check']

/** The batch form on a phone: one group of questions a step, any step in reach, nothing lost between them. */
export function SteppedBatch({ firstStep, ...desk }: BatchDeskProps & { firstStep: number }) {
  const form = useFormContext<BatchTyping>()
  const [at, setAt] = useState(firstStep)
  const [tries, setTries] = useState(0)
  const step = batchSteps[at]
  const { publishing } = desk

  function show(to: number) {
    setAt(to)
    setTries(0)
    if (to === checkStep) void form.trigger()
  }
  function go(to: number) {
    show(to)
    requestAnimationFrame(() => focusElement(`${groupIds[to] ?? ''}-heading`))
  }
  async function next() {
    if (!step || (await form.trigger([...step.fields]))) go(at + 1)
    else setTries((count) => count + 1)
  }

  return (
    <Page
      title={titleOfBatch(desk.own)}
      isHeadingHidden
      width="readable"
      back={{ label: 'Back to selling', href: '/sell' }}
      footer={
        <StepFooter
          at={at}
          draftState={desk.draftState}
          isBusy={publishing.isBusy}
          mayPublish={desk.own.may.includes('submit')}
          onBack={() => go(at - 1)}
          onNext={() => void next()}
          onLater={tries > 0 ? () => go(at + 1) : undefined}
          onPublish={() => void publishing.publish()}
        />
      }
    >
      <Steps label="Steps of this batch" steps={titles} current={at} />
      <StaleBanner {...desk} />
      {step ? (
        <>
          <StepErrors step={at} tries={tries} />
          <BatchGroup stepId={step.id} setting={desk.setting} />
        </>
      ) : (
        <>
          <BatchErrors
            attempt={publishing.attempt}
            trouble={publishing.trouble}
            onOpen={(fieldId) => show(stepOfField(nameOfFieldId(fieldId)))}
          />
          <CheckGroup own={desk.own} setting={desk.setting} onGo={go} />
        </>
      )}
    </Page>
  )
}
