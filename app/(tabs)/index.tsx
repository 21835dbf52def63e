import { FindScreen } from '@/components/find/find-screen'

export default function Find() {
  return <FindScreen />
}
