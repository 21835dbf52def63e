import { useState } from 'react'
import { FormProvider, useForm, type FieldPath } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { farmAsks } from './farm-asks'
import { farmBody, farmIssues } from './farm-body'
import { FarmGroups } from './farm-groups'
import { farmTyping, type FarmTyping } from './farm-typing'

import { issueResolver } from '@/components/forms/issue-resolver'
import { Button } from '@/components/ui/button'
import { space } from '@/constants/theme'
import { newRequestKey } from '@/hooks/request-key'
import { useSaveFarm, type FarmBody } from '@/hooks/use-save-farm'
import { Problem } from '@/shared/api/problem'
import type { OwnSeller } from '@/shared/contracts/sellers'

import { FarmErrors } from './farm-errors'

interface Props {
  farm: OwnSeller | null
  onSaved: (saved: OwnSeller) => void
}

export function FarmForm({ farm, onSaved }: Props) {
  const save = useSaveFarm(farm !== null)
  const [attempt, setAttempt] = useState(0)
  const [trouble, setTrouble] = useState('')
  // Other words after a refusal are another command.
  const [key, setKey] = useState(newRequestKey)
  const form = useForm<FarmTyping>({
    defaultValues: farmTyping(farm),
    resolver: issueResolver<FarmTyping>(farmIssues, { lists: ['licences'], asks: farmAsks }),
    mode: 'onTouched',
    shouldFocusError: false,
  })

  function refused(error: Error) {
    const errors = error instanceof Problem ? (error.errors ?? []) : []
    for (const { pointer, detail } of errors) {
      const path = pointer.replace('#/', '').replaceAll('/', '.')
      const name = (path === 'licences' ? 'licences.root' : path) as FieldPath<FarmTyping>
      form.setError(name, { type: 'server', message: detail })
    }
    setTrouble(errors.length > 0 ? '' : error.message)
    if (error instanceof Problem) setKey(newRequestKey())
    setAttempt((count) => count + 1)
  }
  async function send() {
    setTrouble('')
    if (!(await form.trigger())) return setAttempt((count) => count + 1)
    // Checked against the contract by the resolver just now.
    save.mutate(
      { farm: farmBody(form.getValues()) as FarmBody, key },
      { onSuccess: onSaved, onError: refused },
    )
  }

  return (
    <FormProvider {...form}>
      <View role="form" aria-label="Your farm" style={styles.form}>
        <FarmErrors attempt={attempt} trouble={trouble} />
        <FarmGroups />
        <Button
          label={farm ? 'Save the farm' : 'Go on to payouts'}
          busyLabel="Saving"
          isBusy={save.isPending}
          isWide
          onPress={() => void send()}
        />
      </View>
    </FormProvider>
  )
}

const styles = StyleSheet.create({ form: { gap: space.xl } })
