import { Tabs } from 'expo-router/js-tabs'

// The bar and the rail are drawn by the frame, so that the rail also stands beside pages outside the places.
export default function TabsLayout() {
  return <Tabs tabBar={() => null} screenOptions={{ headerShown: false }} />
}
