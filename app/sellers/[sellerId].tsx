import { useLocalSearchParams } from 'expo-router'

import { SellerScreen } from '@/components/sellers/seller-screen'

export default function SellerPage() {
  const { sellerId } = useLocalSearchParams<'/sellers/[sellerId]'>()
  return <SellerScreen sellerId={sellerId} />
}
