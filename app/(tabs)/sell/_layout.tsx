import { Stack } from 'expo-router'

export const unstable_settings = { initialRouteName: 'index' }

// A stack of its own: a form that is left is closed, and does not stay open behind the other places.
export default function SellLayout() {
  return <Stack screenOptions={{ headerShown: false, animation: 'none' }} />
}
