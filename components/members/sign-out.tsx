import { useRouter } from 'expo-router'

import { Button } from '@/components/ui/button'
import { useToast } from '@/components/ui/toast'
import { useAuthAct } from '@/hooks/use-auth'

export function SignOut() {
  const router = useRouter()
  const toast = useToast()
  const signOut = useAuthAct('signOut')
  return (
    <Button
      kind="secondary"
      label="Sign out"
      busyLabel="Signing out"
      isBusy={signOut.isPending}
      onPress={() =>
        signOut.mutate(
          {},
          {
            onSuccess: () => router.replace('/'),
            onError: ({ message }) => toast({ text: message, tone: 'danger' }),
          },
        )
      }
    />
  )
}
