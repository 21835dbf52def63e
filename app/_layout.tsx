import { QueryClientProvider } from '@tanstack/react-query'
import { Stack } from 'expo-router'

import { Frame } from '@/components/layout/frame'
import { ToastProvider } from '@/components/ui/toast'
import { useAppFonts } from '@/components/layout/use-app-fonts'
import { useTheme } from '@/hooks/use-theme'
import { queryClient } from '@/hooks/query-client'

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
