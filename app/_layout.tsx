import { QueryClientProvider } from '@tanstack/react-query'
import { Stack } from 'expo-router'

import { allowOwnScripts } from '@/components/layout/allow-own-scripts'
import { Frame } from '@/components/layout/frame'
import { useAppFonts } from '@/components/layout/use-app-fonts'
import { ToastProvider } from '@/components/ui/toast'
import { queryClient } from '@/hooks/query-client'
import { useTheme } from '@/hooks/use-theme'

allowOwnScripts()

export default function RootLayout() {
  const hasFonts = useAppFonts()
  useTheme() // the stored choice of scheme holds from the first screen on
  if (!hasFonts) return null
  return (
    <QueryClientProvider client={queryClient}>
      <ToastProvider>
        <Frame>
          <Stack screenOptions={{ headerShown: false, animation: 'none' }} />
        </Frame>
      </ToastProvider>
    </QueryClientProvider>
  )
}
